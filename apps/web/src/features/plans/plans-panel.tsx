import { Button, Stack, Text } from '@chakra-ui/react';
import { useQuery } from '@tanstack/react-query';
import { CalendarPlus } from 'lucide-react';
import { Link } from 'react-router-dom';
import { Loaded } from '../../components/loaded';
import { Panel } from '../../components/panel';
import { plansQuery } from './api/plans';
import { PlanRow } from './plan-row';

/** What is planned on a bike beside the usual riding. */
export function PlansPanel({ bikeId }: { bikeId: string }) {
  const plans = useQuery(plansQuery(bikeId));
  return (
    <Panel title="Planned riding">
      <Loaded query={plans} rows={1} height="4rem">
        {({ items }) =>
          items.length === 0 ? (
            <Text color="fg.muted" mb="4">
              A tour or a training week ahead? Plan it, and see whether the chain will last.
            </Text>
          ) : (
            <Stack as="ul" listStyleType="none" gap="0" mb="4">
              {items.map((plan) => (
                <PlanRow key={plan.id} plan={plan} />
              ))}
            </Stack>
          )
        }
      </Loaded>
      <Button asChild variant="outline">
        <Link to={`/plans/new?bike=${bikeId}`}>
          <CalendarPlus size={20} aria-hidden="true" /> Plan riding
        </Link>
      </Button>
    </Panel>
  );
}
