import type { FileSurface } from './types';

/** Words for riding a bicycle, and for everything else, in the sport names of files. */
const riding = /\b(?:\w*cycl\w*|\w*bik\w*|ride|riding|v[eé]lo|mtb|gravel|spin(?:ning)?)\b/i;
const notBicycle = /motor|horse|snow ?bik|transition/i;
const others =
  /\b(?:run|jog|walk|hik|trek|swim|row|paddl|kayak|canoe|surf|sail|ski|skat|snow|climb|yoga|golf|tennis|gym|fitness|strength|driv|motor|horse|fly|transition|workout|elliptical|football|soccer|basketball|volleyball|handball|badminton|squash|danc|pilates|stretch|weights?\b|stair)\w*/i;
const indoors = /\b(?:indoor|virtual|trainer|spin)/i;

/** 'fitnessEquipment/indoorRowing' gives 'fitness equipment, indoor rowing'; the empty word 'generic' is dropped. */
export function sportWords(sport: string): string {
  const parts = sport.split('/').filter((part) => part !== 'generic');
  return parts
    .map((part) =>
      part
        .replace(/[_-]+/g, ' ')
        .replace(/([a-z])([A-Z])/g, '$1 $2')
        .toLowerCase(),
    )
    .join(', ');
}

/** True for cycling, false for another sport, null when the words name neither. */
export function isCycling(sport: string | null): boolean | null {
  const words = sportWords(sport ?? '');
  if (riding.test(words) && !notBicycle.test(words)) return true;
  return others.test(words) ? false : null;
}

/** True when the words say that the ride was indoors, null when they do not say. */
export function isIndoor(sport: string | null): boolean | null {
  return indoors.test(sportWords(sport ?? '')) ? true : null;
}

/** Surface that the words name: 'indoor', or a kind of riding such as 'gravelCycling'; null otherwise. */
export function surfaceInSport(sport: string | null): FileSurface | null {
  const words = sportWords(sport ?? '');
  if (indoors.test(words)) return 'indoor';
  if (/\bgravel|cyclo ?cross/i.test(words)) return 'gravel';
  if (/\bmountain|\bmtb|downhill/i.test(words)) return 'mountain';
  return /\broad\b/i.test(words) ? 'road' : null;
}

/** A track's name as its sport, where it is hardly more than one ('Run', 'Evening ride'); else null. */
export function sportInName(name: string | null): string | null {
  if (name === null || name.trim().split(/\s+/).length > 3) return null;
  return isCycling(name) === null ? null : name;
}
