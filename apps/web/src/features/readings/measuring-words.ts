import type { ReadingMethod } from '@halfpitch/contracts';

/** How to read each tool, in order. */
export const measuringSteps: Record<ReadingMethod, string[]> = {
  'steel-rule': [
    'Press lightly on a pedal so that the lower run is taut, or hang the chain up by one end.',
    'Lay the rule’s zero on the middle of a pin.',
    'Read where the middle of the 24th pin after it stands: on a new chain at 12 inches, or 304.8 mm.',
  ],
  'three-point': [
    'Keep the chain taut with a light press on a pedal.',
    'Set the fixed points into the chain, then push the moving one until it stops: both ends lean on rollers from the same side, so their play does not count.',
    'Read the figure where it stops.',
  ],
  'two-point': [
    'Keep the chain taut with a light press on a pedal.',
    'Set both points between the rollers and push until it stops.',
    'Read the figure. It counts the rollers’ play too, so it shows more than a rule; the estimate allows for that.',
  ],
  digital: [
    'Zero the gauge as its maker says, on its own setting piece.',
    'Set its points into the taut chain and let it settle.',
    'Enter the percent it shows, or the millimetres with the pitches it spans.',
  ],
  'drop-in': [
    'Hook one end on a roller.',
    'See whether the other end drops between the rollers under its own weight. Do not press.',
    'Enter the largest step that goes in and the smallest that does not.',
  ],
};

export const MEASURING_ANYWHERE = [
  'Measure a clean chain: dirt between the rollers falsifies every tool.',
  'Measure at three places, a third of the chain apart; the worst place counts.',
  'Leave the quick link out: it wears otherwise than the rest.',
];

export const MEASURING_CAUTION =
  'Turn the cranks by hand only, and keep fingers, hair and sleeves clear of chain and sprockets. On an e-bike switch the drive off and take the battery out first. Keep oily hands off rotors, rims and pads. The maker’s manual comes first.';
