/** A drawn rectangle in px. */
export interface Box {
  x: number;
  y: number;
  width: number;
  height: number;
}

export function part(figure: Element, name: string): Element | null {
  return figure.querySelector(`[data-part="${name}"]`);
}

export function box(figure: Element, name: string): Box {
  const element = part(figure, name);
  if (element === null) throw new Error(`nothing drawn as ${name}`);
  const number = (attribute: string) => Number(element.getAttribute(attribute));
  return { x: number("x"), y: number("y"), width: number("width"), height: number("height") };
}

/** All words and numbers written in a figure. */
export function written(figure: Element): string {
  return [...figure.querySelectorAll("text")].map((text) => text.textContent).join(" | ");
}
