import { Text } from '@chakra-ui/react';
import type { Chain, ChainState } from '@halfpitch/contracts';
import { chance, elongation } from '../../app/format';

/** From this chance of being past the limit on, it is said. */
const WORTH_SAYING = 0.1;

/** Elongation against its limit: '0.38 % of 0.50 % · 40 % chance it is past it'. */
export function ElongationLine({ chain, state }: { chain: Pick<Chain, 'limitPct'>; state: ChainState }) {
  const past = state.chancePast >= WORTH_SAYING;
  return (
    <Text color={past ? 'fg' : 'fg.muted'} fontVariantNumeric="tabular-nums">
      Lengthened {elongation(Math.max(0, state.elongationPct))}, limit {elongation(chain.limitPct)}
      {past && (
        <Text as="span" fontWeight="semibold">
          {' '}
          · {chance(state.chancePast)} likely past it
        </Text>
      )}
    </Text>
  );
}
