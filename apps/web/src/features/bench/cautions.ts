import type { TreatmentInput } from '@halfpitch/contracts';

type Kind = TreatmentInput['kind'];

export interface Caution {
  about: string;
  text: string;
}

/** Common workshop practice and the wax and solvent makers' general warnings; no single source. */
const hotWax: Caution[] = [
  {
    about: 'Hot wax',
    text: 'Use a pot with a thermostat. Never melt wax on an open flame, and never leave it alone.',
  },
  {
    about: 'Wet chain',
    text: 'A wet chain makes hot wax spatter, and water flashes to steam. Dry it through first.',
  },
  { about: 'Wax fire', text: 'Lid on, power off. Never water.' },
  { about: 'Burns', text: 'Cool with water. Do not pull the wax off the skin.' },
];

const solvent: Caution = {
  about: 'Solvents',
  text: 'Ventilate, wear gloves, keep flames and sparks away. Never dry a chain with solvent on it in an oven.',
};

const brakes: Caution = {
  about: 'Brakes',
  text: 'Lubricant or cleaner on a rotor, rim or pad makes the brake fail. Cover them, and test the brakes after.',
};

const quickLink: Caution = {
  about: 'Quick link',
  text: 'Use it again only as many times as its maker allows; some are for one use. Check that it has clicked home.',
};

const always: Caution = {
  about: 'Always',
  text: 'The maker’s manual and local rules come first. Safety work is for a competent mechanic.',
};

const CAUTIONS: Record<Kind, Caution[]> = {
  'strip-wax': [...hotWax, solvent, quickLink, brakes, always],
  're-wax': [...hotWax, quickLink, brakes, always],
  'drip-top-up': [brakes, always],
  'oil-wet': [solvent, brakes, quickLink, always],
  'oil-dry': [solvent, brakes, quickLink, always],
};

/** What to mind for a treatment, most dangerous first. */
export const cautionsFor = (kind: Kind): readonly Caution[] => CAUTIONS[kind];
