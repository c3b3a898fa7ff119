import type { Alert, Regime } from '@halfpitch/contracts';
import { dayWords } from '../../app/format';

export interface AlertWords {
  /** What is the matter. */
  title: string;
  /** What to do, in order. */
  steps: string[];
  caution?: string;
}

const NEXT_AFTER_WET: Record<Regime, string> = {
  'immersion-wax':
    'Water washes wax out: bring it in for a re-wax soon, or top it up with drip wax until then.',
  'drip-wax': 'When it is dry, top it up with drip wax and let that set before you ride.',
  'wet-oil': 'When it is dry, clean it and put one drop of oil on each roller; wipe off the rest.',
  'dry-oil': 'Dry oil does not outlast rain: when the chain is dry, clean it and oil it anew.',
};
const WAXED: readonly Regime[] = ['immersion-wax', 'drip-wax'];
const KEEP_OFF =
  'Turn the cranks by hand and keep fingers clear of the sprockets. Nothing that greases may reach a brake rotor, a rim or a pad: the brake would fail. Follow the maker’s manual.';
const HOT_WAX = 'A wet chain never goes into hot wax: it spatters. ';

function afterWet(day: string, regime: Regime, today: string): AlertWords {
  return {
    title: `It was ridden wet ${day === today ? 'today' : `on ${dayWords(day, today)}`}: dry the chain now`,
    steps: [
      'Run it through a dry cloth and let it dry in a warm room, not overnight in the cold: rust starts between pin and roller.',
      NEXT_AFTER_WET[regime],
    ],
    caution: (WAXED.includes(regime) ? HOT_WAX : '') + KEEP_OFF,
  };
}

/** An alert in words: what is the matter, what to do, and the caution that goes with it. */
export function alertWords({ code, day, data }: Alert, regime: Regime, today: string): AlertWords {
  switch (code) {
    case 'wet-ride-rust':
      return afterWet(day, regime, today);
    case 'past-limit':
      return {
        title: `It is past its limit with a chance of ${data.chance} %`,
        steps: [
          'Measure it once more, then have it replaced: a chain past its limit wears the cassette and chainrings until a new one skips on them.',
        ],
        caution: 'A worn chain can skip under load or break. Ride gently until it is replaced.',
      };
    case 'treatment-spent':
      return {
        title: 'The treatment is used up',
        steps: ['Have it treated now. Riding on dry wears pins and rollers several times faster.'],
      };
    case 'quiet-log':
      return {
        title: 'No rides were logged for a while',
        steps: [
          'If you did ride, log it or give the odometer’s figure: the windows here are a guess until then.',
        ],
      };
    case 'doubted-arrival':
      return {
        title: `How it arrived on ${dayWords(day, today)} can hardly be right`,
        steps: [
          `By what is recorded, one treatment lasted ${data.km} counted km. A treatment in between may be missing: record it with its own day. Until then that arrival counts for little.`,
        ],
      };
    case 'doubted-reading':
      return {
        title: `The reading of ${dayWords(day, today)} does not fit the others`,
        steps: ['It is counted for little. Measure again, under tension and at three places, or remove it.'],
      };
  }
}
