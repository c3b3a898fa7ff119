import { Stack } from '@chakra-ui/react';
import type { Regime, TreatmentInput } from '@halfpitch/contracts';
import { useWatch } from 'react-hook-form';
import { Notice } from '../../components/notice';
import { regimeWords } from '../../components/trade-words';
import { CautionBox } from './caution-box';
import { leavesRegime } from './kind-choices';

/** Follows the treatment that is chosen in the form around it. */
export function CautionsOfKind({ regime }: { regime: Regime }) {
  const kind = useWatch({ name: 'kind' }) as TreatmentInput['kind'];
  return (
    <Stack gap="4">
      {leavesRegime(regime, kind) && (
        <Notice>
          This chain is down for {regimeWords[regime].toLowerCase()}. If it changes for good, change it on the
          chain’s page too.
        </Notice>
      )}
      <CautionBox kind={kind} />
    </Stack>
  );
}
