import type { FileSurface, FileWeather } from '../types';

const surfaces: Record<string, FileSurface> = {
  road: 'road',
  tarmac: 'road',
  paved: 'road',
  asphalt: 'road',
  gravel: 'gravel',
  unpaved: 'gravel',
  track: 'gravel',
  dirt: 'gravel',
  mountain: 'mountain',
  trail: 'mountain',
  mtb: 'mountain',
  singletrack: 'mountain',
  indoor: 'indoor',
  trainer: 'indoor',
  rollers: 'indoor',
};
const weathers: Record<string, FileWeather> = {
  dry: 'dry',
  sunny: 'dry',
  clear: 'dry',
  damp: 'damp',
  drizzle: 'damp',
  wet: 'wet',
  rain: 'wet',
  rainy: 'wet',
  snow: 'wet',
  mud: 'mud',
  muddy: 'mud',
};
const yes = ['1', 'yes', 'y', 'true', 'x', 'indoor', 'indoors'];
const no = ['0', 'no', 'n', 'false', 'outdoor', 'outdoors'];

export const surfaceOf = (text: string): FileSurface | null => surfaces[text.toLowerCase()] ?? null;
export const weatherOf = (text: string): FileWeather | null => weathers[text.toLowerCase()] ?? null;

/** True, false, or null when the cell is empty or says something else. */
export function yesOrNo(text: string): boolean | null {
  const word = text.toLowerCase();
  return yes.includes(word) ? true : no.includes(word) ? false : null;
}
