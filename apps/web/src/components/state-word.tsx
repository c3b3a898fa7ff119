import { HStack } from '@chakra-ui/react';
import type { Dryness } from '@halfpitch/contracts';
import { drynessColour, drynessWords } from './drawings/dryness';

/** How much of the roller is filled, so that the sign reads without colour. */
const FILLED: Record<Dryness, number> = { fresh: 5, turning: 13, dry: 20 };

/** The dryness word with its place on the ramp: a roller, filled little, much or wholly. */
export function StateWord({ dryness }: { dryness: Dryness }) {
  return (
    <HStack as="span" display="inline-flex" gap="2" fontWeight="semibold" whiteSpace="nowrap">
      <svg width="20" height="20" viewBox="0 0 20 20" aria-hidden="true">
        <clipPath id={`roller-${dryness}`}>
          <rect x="0" y={20 - FILLED[dryness]} width="20" height={FILLED[dryness]} />
        </clipPath>
        <circle cx="10" cy="10" r="8.5" fill="var(--hp-colors-bg-panel)" />
        <circle cx="10" cy="10" r="8.5" fill={drynessColour(dryness)} clipPath={`url(#roller-${dryness})`} />
        <circle cx="10" cy="10" r="8.5" fill="none" stroke="var(--hp-colors-fg)" strokeWidth="1.5" />
      </svg>
      {drynessWords[dryness]}
    </HStack>
  );
}
