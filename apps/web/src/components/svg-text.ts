/** What a drawing on the page takes from its styles, and a file must carry itself. */
const CARRIED = [
  'fill',
  'stroke',
  'stroke-width',
  'stroke-dasharray',
  'opacity',
  'font-family',
  'font-size',
  'font-weight',
];

function carryStyles(from: Element, to: Element): void {
  const style = getComputedStyle(from);
  const given = CARRIED.filter((name) => style.getPropertyValue(name) !== '');
  given.forEach((name) => to.setAttribute(name, style.getPropertyValue(name)));
  [...from.children].forEach((child, i) => carryStyles(child, to.children[i]!));
}

/** A drawing as the text of an SVG file that looks the same outside the page, ground included. */
export function svgText(drawing: SVGSVGElement): string {
  const copy = drawing.cloneNode(true) as SVGSVGElement;
  carryStyles(drawing, copy);
  const { width, height } = drawing.getBoundingClientRect();
  copy.setAttribute('width', String(width));
  copy.setAttribute('height', String(height));
  copy.style.background =
    getComputedStyle(document.body).backgroundColor ||
    getComputedStyle(document.documentElement).backgroundColor;
  return new XMLSerializer().serializeToString(copy);
}
