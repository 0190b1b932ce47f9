export { StructureSolver } from "./interior/structureSolver.ts";
