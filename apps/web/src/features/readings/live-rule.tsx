import { Box, Text } from '@chakra-ui/react';
import type { Chain } from '@halfpitch/contracts';
import { useWatch } from 'react-hook-form';
import { Rule } from '../../components/drawings/rule';
import type { ReadingForm } from './reading-form';
import { measured } from './reading-form';
import { shownOnRule } from './shown-on-rule';

/** The lengthening as it is entered, on the rule; before that, as it is estimated. */
export function LiveRule({ chain }: { chain: Chain }) {
  const form = useWatch() as ReadingForm;
  const entered = measured(form);
  const shown = entered ? shownOnRule(entered) : { value: Math.max(0, chain.state?.elongationPct ?? 0) };
  return (
    <Box aria-live="polite">
      <Rule {...shown} limit={chain.limitPct} label={entered ? 'Entered' : 'Estimated so far'} />
      {!entered && (
        <Text color="fg.muted" textStyle="sm">
          So far this is the estimate: it moves with what you enter.
        </Text>
      )}
    </Box>
  );
}
