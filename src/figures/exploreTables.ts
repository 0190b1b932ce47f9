import type { ExplorerData } from "./explorer.ts";

/**
 * Runs in the page: fills every explorable table from its data block, and sorts, filters and turns pages. Its own text
 * is written into the page, so it uses nothing from outside itself. Cells are set as text, never as markup.
 */
export function exploreTables(): void {
  const pageSize = 200;
  for (const explorer of document.querySelectorAll<HTMLElement>(".explorer")) explore(explorer);

  function explore(explorer: HTMLElement): void {
    const table = explorer.querySelector("table") as HTMLTableElement;
    const region = explorer.querySelector(".table-region") as HTMLElement;
    const body = table.tBodies[0] as HTMLTableSectionElement;
    const headers = [...(table.tHead as HTMLTableSectionElement).querySelectorAll("th")];
    const choices = [...explorer.querySelectorAll("select")];
    const search = explorer.querySelector("input") as HTMLInputElement;
    const status = explorer.querySelector("[role=status]") as HTMLElement;
    const steps = [...explorer.querySelectorAll<HTMLButtonElement>("button[data-step]")];
    const block = document.getElementById(`${explorer.dataset.table}-data`);
    const { noun, columns, texts, rows }: ExplorerData = JSON.parse(block?.textContent ?? "");
    const lowerCase = texts.map((text) => text.toLowerCase());
    let sort = { column: -1, direction: 1 };
    let shown = rows;
    let first = 0;

    const select = () => {
      const wanted = search.value.trim().toLowerCase();
      const hits = lowerCase.map((text) => text.includes(wanted));
      const chosen = choices.flatMap(({ value, dataset }) =>
        value === "" ? [] : [{ column: Number(dataset.column), place: Number(value) }],
      );
      shown = rows.filter(
        (row) => chosen.every(({ column, place }) => row[column] === place) && row.some((place) => hits[place]),
      );
      if (sort.column >= 0) shown = [...shown].sort(comparison(sort.column, sort.direction));
      first = 0;
      show();
    };

    /** Cells without a value stay last in both directions. */
    const comparison = (column: number, direction: number) => {
      const { numeric, order } = columns[column];
      const keys = texts.map((text, place) => {
        if (order) return order.indexOf(text);
        return numeric ? Number.parseFloat(text.replaceAll("−", "-")) : lowerCase[place];
      });
      const isEmpty = keys.map((key) => key === "" || Number.isNaN(key));
      return (a: readonly number[], b: readonly number[]) => {
        const [x, y] = [a[column], b[column]];
        if (isEmpty[x] || isEmpty[y]) return Number(isEmpty[x]) - Number(isEmpty[y]);
        return keys[x] < keys[y] ? -direction : keys[x] > keys[y] ? direction : 0;
      };
    };

    const show = () => {
      const page = shown.slice(first, first + pageSize);
      body.replaceChildren(...page.map(rowElement));
      region.scrollTop = 0;
      const range = page.length > 0 ? `${count(first + 1)}–${count(first + page.length)} of ` : "";
      const total = shown.length < rows.length ? `, of ${count(rows.length)} in all` : "";
      status.textContent = `${range}${count(shown.length)} ${noun}${total}`;
      for (const step of steps) step.disabled = !isPage(first + Number(step.dataset.step) * pageSize);
    };

    const count = (number: number) => number.toLocaleString("en");
    const isPage = (start: number) => start >= 0 && start < shown.length;

    const rowElement = (row: readonly number[]) => {
      const element = document.createElement("tr");
      for (const [i, place] of row.entries()) {
        const cell = document.createElement(i === 0 ? "th" : "td");
        if (i === 0) cell.setAttribute("scope", "row");
        cell.className = columns[i].className;
        // Names in another direction of writing must not reorder what stands beside them.
        cell.append(Object.assign(document.createElement("bdi"), { textContent: texts[place] }));
        element.append(cell);
      }
      return element;
    };

    const sortBy = (column: number) => {
      const again = sort.column === column;
      if (again && sort.direction < 0) sort = { column: -1, direction: 1 };
      else sort = { column, direction: again ? -1 : 1 };
      for (const [i, header] of headers.entries()) {
        if (i !== sort.column) header.removeAttribute("aria-sort");
        else header.setAttribute("aria-sort", sort.direction > 0 ? "ascending" : "descending");
      }
      select();
    };

    for (const [i, header] of headers.entries())
      header.querySelector("button")?.addEventListener("click", () => sortBy(i));
    for (const choice of choices) choice.addEventListener("change", select);
    search.addEventListener("input", select);
    for (const step of steps) {
      step.addEventListener("click", () => {
        first += Number(step.dataset.step) * pageSize;
        show();
      });
    }
    // A reload keeps what was chosen.
    select();
  }
}
