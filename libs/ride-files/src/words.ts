/** '850 m' or '12.3 km', as sentences give a distance. */
export function distanceWords(metres: number): string {
  return metres < 1000 ? `${Math.round(metres)} m` : `${(metres / 1000).toFixed(1)} km`;
}
