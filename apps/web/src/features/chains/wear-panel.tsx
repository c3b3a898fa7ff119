import { Link, Stack, Text } from '@chakra-ui/react';
import type { Chain, ChainEstimate } from '@halfpitch/contracts';
import { Link as RouterLink } from 'react-router-dom';
import { chance } from '../../app/format';
import { useFormat } from '../../app/use-format';
import { DueWindow } from '../../components/drawings/due-window';
import { Rule } from '../../components/drawings/rule';
import { Notice } from '../../components/notice';
import { Panel } from '../../components/panel';
import { narrowWords } from './estimate-words';
import { Reasons } from './window-facts';

function DistanceLine({ estimate }: { estimate: ChainEstimate }) {
  const { distance } = useFormat();
  const { totalKm, unloggedKm, kmPerWeek } = estimate;
  return (
    <Text color="fg.muted">
      It has run {distance(totalKm * 1000)}
      {unloggedKm >= 1 && `, ${distance(unloggedKm * 1000)} of it unlogged distance from the odometer`}.
      Ahead, about {distance(kmPerWeek.p50 * 1000)} a week are reckoned with, likely between{' '}
      {distance(kmPerWeek.p10 * 1000)} and {distance(kmPerWeek.p90 * 1000)}.
    </Text>
  );
}

/** How far it has lengthened, when it must be replaced, and what being late does. */
export function WearPanel({ chain, estimate }: { chain: Chain; estimate: ChainEstimate }) {
  const { today } = useFormat();
  const { elongation, replacement, chancePast, reasons, narrows } = estimate;
  const narrower = narrowWords(narrows);
  return (
    <Panel title="Replacement">
      <Stack gap="5">
        <Rule value={elongation.now.p50} limit={chain.limitPct} band={elongation.now} label={chain.label} />
        <DueWindow {...replacement} today={today} label="Replacement" />
        <Text>Chance that it is past its limit now: {chance(chancePast)}.</Text>
        {narrower && (
          <Text>
            {narrower}{' '}
            <Link asChild>
              <RouterLink to={`/chains/${chain.id}/reading`}>Enter a reading</RouterLink>
            </Link>
          </Text>
        )}
        <Reasons reasons={reasons.filter(({ about }) => about === 'replacement')} />
        <DistanceLine estimate={estimate} />
        <Notice>
          Replaced in time, a chain is all that is replaced. Late, it has worn the sprockets to its own pitch:
          a new chain skips on them, and cassette and chainrings must go too, at several times the chain’s
          price.
        </Notice>
      </Stack>
    </Panel>
  );
}
