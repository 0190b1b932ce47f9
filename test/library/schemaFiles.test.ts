import { expect, test } from "vitest";
import { schemaFiles } from "../../src/library/schemaFiles.ts";

// Written anew by `npx vitest run --config test/config/vitest.config.ts test/library/schemaFiles.test.ts --update`.
test.each(schemaFiles())("$path is what the validator says", async ({ path, text }) => {
  await expect(text).toMatchFileSnapshot(`../../${path}`);
});

test("a layer of the schema is of one kind", () => {
  const { text } = schemaFiles()[1];
  expect(JSON.parse(text).properties.layers.items.oneOf).toEqual([
    { required: ["material"] },
    { required: ["mixture"] },
    { required: ["composition"] },
  ]);
});
