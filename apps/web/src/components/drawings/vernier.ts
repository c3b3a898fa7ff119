/** Pitches under a 12-inch rule: 24 of half an inch. */
export const PITCHES = 24;
/** One division of the main scale, % of elongation; the slide's ten are each a tenth shorter. */
export const DIVISION = 0.1;
const SLIDE = 9 * DIVISION;

/** Left and right end of the scales in drawing units. */
export const [LEFT, RIGHT] = [20, 460] as const;

/** Where the main scale ends, %: 2 at least, and far enough for the slide to lie on it. */
export const scaleEnd = (value: number): number => Math.max(2, Math.ceil((value + SLIDE) * 2 - 1e-9) / 2);

/** Drawing units from the left for an elongation in %. */
export const along = (pct: number, end: number): number => LEFT + (pct / end) * (RIGHT - LEFT);

/** Elongation as it can be drawn: to a hundredth of a percent, never below nothing. */
export const readable = (value: number): number => Math.max(0, Math.round(value * 100) / 100);

/** The slide's eleven lines for an elongation, %: zero stands at the value, the last nine divisions on. */
export const slideLines = (value: number): number[] =>
  Array.from({ length: 11 }, (_, i) => readable(value) + (i * SLIDE) / 10);

/** Which line of the slide meets one of the main scale: the hundredths of the value. */
export const meeting = (value: number): number => Math.round(readable(value) * 100) % 10;

/** The main scale's lines up to its end, %. */
export const mainLines = (end: number): number[] =>
  Array.from({ length: Math.round(end / DIVISION) + 1 }, (_, i) => i / 10);
