import { Text } from '@chakra-ui/react';
import type { Chain } from '@halfpitch/contracts';
import { elongation } from '../../app/format';
import { useFormat } from '../../app/use-format';

/** Elongation against its limit and when to replace, in one line. */
export function WearLine({ chain }: { chain: Chain }) {
  const { window } = useFormat();
  if (!chain.state) return null;
  const { elongationPct, replacement } = chain.state;
  return (
    <Text color="fg.muted">
      <Text as="span" color="fg" fontWeight="semibold" fontVariantNumeric="tabular-nums">
        {elongation(Math.max(0, elongationPct))}
      </Text>{' '}
      longer than new, of {elongation(chain.limitPct)} allowed. Replacement {window(replacement)}.
    </Text>
  );
}
