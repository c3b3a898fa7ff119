import { Stack, Text } from '@chakra-ui/react';
import type { Chain, ChainEstimate } from '@halfpitch/contracts';
import { useFormat } from '../../app/use-format';
import { DueWindow } from '../../components/drawings/due-window';
import { LinkStrip } from '../../components/drawings/link-strip';
import { Panel } from '../../components/panel';
import { treatmentWords } from '../../components/trade-words';
import { dueWords } from './chain-words';
import { Chances, Reasons } from './window-facts';

function TreatmentLine({ treatment }: Pick<ChainEstimate, 'treatment'>) {
  const { day, distance } = useFormat();
  const { kind, since, lubeKmUsed, life } = treatment;
  return (
    <Text color="fg.muted">
      {treatmentWords[kind]} on {day(since)}. Since then {distance(lubeKmUsed * 1000)} were ridden, wet and
      rough riding counted for more; it likely lasts {distance(life.p10 * 1000)} to{' '}
      {distance(life.p90 * 1000)}.
    </Text>
  );
}

/** When the chain is due for wax or oil, how sure that is, and why. */
export function LubricationPanel({ chain, estimate }: { chain: Chain; estimate: ChainEstimate }) {
  const { today } = useFormat();
  const { lubrication, reasons, shareUsed, treatment } = estimate;
  const due = dueWords[chain.regime];
  return (
    <Panel title={due}>
      <Stack gap="5">
        <LinkStrip share={shareUsed} label={chain.label} />
        <TreatmentLine treatment={treatment} />
        {lubrication ? (
          <>
            <DueWindow {...lubrication} today={today} label={due} />
            <Chances window={lubrication} />
          </>
        ) : (
          <Text>It rests in the box: nothing is due before it is ridden again.</Text>
        )}
        <Reasons reasons={reasons.filter(({ about }) => about === 'lubrication')} />
      </Stack>
    </Panel>
  );
}
