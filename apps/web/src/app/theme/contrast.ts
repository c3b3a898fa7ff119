const linear = (channel: number) =>
  channel <= 0.04045 ? channel / 12.92 : ((channel + 0.055) / 1.055) ** 2.4;

/** Relative luminance of '#rrggbb', 0 to 1 (WCAG 2.2, "relative luminance"). */
export function luminance(hex: string): number {
  const at = (start: number) => linear(Number.parseInt(hex.slice(start, start + 2), 16) / 255);
  return 0.2126 * at(1) + 0.7152 * at(3) + 0.0722 * at(5);
}

/** Contrast ratio of two colours, 1 to 21 (WCAG 2.2, "contrast ratio"). */
export function contrast(a: string, b: string): number {
  const [darker, lighter] = [luminance(a), luminance(b)].sort((x, y) => x - y) as [number, number];
  return (lighter + 0.05) / (darker + 0.05);
}

/** Lightness L* of '#rrggbb', 0 to 100 (CIE 1976). */
export function lightness(hex: string): number {
  const y = luminance(hex);
  return y > 216 / 24389 ? 116 * Math.cbrt(y) - 16 : (24389 / 27) * y;
}
