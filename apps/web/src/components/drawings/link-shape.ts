/** Half an inch on paper: the distance from pin to pin in drawing units. */
export const PITCH = 40;
export const ROLLER = 11.5;
const LOBE = 15;
const WAIST = 4;

/** Outline of one side plate from pin to pin, waisted as plates are. */
export function platePath(x1: number, x2: number, y: number): string {
  const [top, bottom, middle] = [y - LOBE, y + LOBE, (x1 + x2) / 2];
  return [
    `M${x1} ${top}`,
    `A${LOBE} ${LOBE} 0 0 0 ${x1} ${bottom}`,
    `Q${middle} ${y + WAIST} ${x2} ${bottom}`,
    `A${LOBE} ${LOBE} 0 0 0 ${x2} ${top}`,
    `Q${middle} ${y - WAIST} ${x1} ${top}Z`,
  ].join('');
}

/** Rollers on a strip; each stands for a tenth of the treatment. */
export const ROLLERS = 13;
export const rollerX = (index: number): number => PITCH / 2 + index * PITCH;

/** How far from the left edge the strip is filled at a share used, drawing units. */
export function filledTo(share: number): number {
  const tenths = Math.min(ROLLERS, Math.max(0, share * 10));
  const whole = Math.min(ROLLERS - 1, Math.floor(tenths));
  return rollerX(whole) - ROLLER + (tenths - whole) * 2 * ROLLER;
}
