import { Text } from '@chakra-ui/react';
import type { EstimationModel, WorkshopSettings } from '@halfpitch/contracts';
import type { UseQueryResult } from '@tanstack/react-query';
import { percent } from '../../app/format';
import { useFormat } from '../../app/use-format';
import { DueWindow } from '../../components/drawings/due-window';
import { Panel } from '../../components/panel';

const isoIn = (today: string, days: number) =>
  new Date(Date.parse(`${today}T00:00:00Z`) + days * 86_400_000).toISOString().slice(0, 10);

interface HowWindowProps {
  policy: WorkshopSettings['reminderPolicy'];
  model: UseQueryResult<EstimationModel>;
}

/** Whose logs the riding ahead was learned from. */
function riders({ ownRiders, shippedRiders }: EstimationModel['riding']): string {
  const shipped = `${shippedRiders} public logs of other riders`;
  if (ownRiders === 0)
    return `How riding goes on was learned from ${shipped}; the workshop’s own count as soon as ten bikes have half a year of log.`;
  return `How riding goes on was learned from the logs of ${ownRiders} bikes of this workshop, together with ${shipped}.`;
}

/** What a window says, and when it makes a letter. */
export function HowWindow({ policy, model }: HowWindowProps) {
  const { today } = useFormat();
  const example = { p10: isoIn(today, 6), p50: isoIn(today, 13), p90: isoIn(today, 24) };
  return (
    <Panel title="4. A window, not just a date">
      <Text mb="4">
        Nobody knows the rides to come. We take many likely continuations of the rider’s own log, with its
        seasons and pauses and what is planned, and see when each would use the treatment up. In eight of ten
        the chain falls due inside the window; the darkest place is the most likely day. For example:
      </Text>
      <DueWindow {...example} today={today} label="An example" />
      {model.data && <Text mt="4">{riders(model.data.riding)}</Text>}
      <Text mt="4">
        A letter is written when the chance of falling due within {policy.days} days reaches{' '}
        {percent(policy.chance)}, once for each treatment.
      </Text>
    </Panel>
  );
}
