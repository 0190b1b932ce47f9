/** What the drawing script needs of Plotly. */
declare const Plotly: {
  react(element: HTMLElement, traces: Drawn[], layout: DrawnLayout, config: object): Promise<unknown>;
};

interface Drawn {
  legendgroup: string;
  visible?: boolean;
}

interface DrawnLayout {
  width?: number;
  annotations: { name: string; visible?: boolean }[];
}

interface DrawnFigure {
  traces: Drawn[];
  wide: DrawnLayout;
  compact: DrawnLayout;
  config: object;
}

/**
 * Runs in the page: draws the diagram from the page's data block, again when width, colour scheme or print ask for it
 * or a legend entry is pressed. Its own text is written into the page, so it uses nothing from outside itself.
 */
export function drawFigure(): void {
  const diagram = document.getElementById("diagram") as HTMLElement;
  const text = document.getElementById("figure-data")?.textContent ?? "";
  const printing = matchMedia("print");
  const hidden = new Set<string>();
  const printWidth = 660;
  const wideFrom = 720;

  const draw = () => {
    const style = getComputedStyle(document.documentElement);
    const colour = (_key: string, value: unknown) =>
      typeof value === "string" && /^var\(--[\w-]+\)$/.test(value) ? style.getPropertyValue(value.slice(4, -1)) : value;
    const { traces, wide, compact, config }: DrawnFigure = JSON.parse(text, colour);
    const width = printing.matches ? printWidth : diagram.clientWidth;
    const layout = { ...(width < wideFrom ? compact : wide), width };
    for (const trace of traces) trace.visible = !hidden.has(trace.legendgroup);
    for (const label of layout.annotations) label.visible = !hidden.has(label.name);
    Plotly.react(diagram, traces, layout, config);
  };

  const press = (button: HTMLElement) => {
    const group = button.dataset.group ?? "";
    if (!hidden.delete(group)) hidden.add(group);
    button.setAttribute("aria-pressed", String(!hidden.has(group)));
    draw();
  };

  let drawnWidth = diagram.clientWidth;
  const resize = () => {
    if (diagram.clientWidth === drawnWidth) return;
    drawnWidth = diagram.clientWidth;
    draw();
  };

  for (const button of document.querySelectorAll<HTMLElement>("button[data-group]")) {
    button.addEventListener("click", () => press(button));
  }
  matchMedia("(prefers-color-scheme: dark)").addEventListener("change", draw);
  printing.addEventListener("change", draw);
  addEventListener("resize", resize);
  draw();
}
