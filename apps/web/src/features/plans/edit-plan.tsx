import { useQuery } from '@tanstack/react-query';
import { useParams } from 'react-router-dom';
import { Loaded } from '../../components/loaded';
import { PageHeader } from '../../components/page-header';
import { bikeQuery } from '../bikes/api/bike';
import { bikesQuery } from '../bikes/api/bikes';
import { changePlan } from './api/change-plan';
import { planQuery } from './api/plan';
import { PlanForm } from './plan-form';

/** Changes what is planned; the estimate follows. */
export function EditPlan() {
  const { id = '' } = useParams();
  const plan = useQuery(planQuery(id));
  const bike = useQuery({ ...bikeQuery(plan.data?.bikeId ?? ''), enabled: plan.data !== undefined });
  const riderId = bike.data?.riderId;
  const bikes = useQuery({ ...bikesQuery({ riderId }), enabled: riderId !== undefined });
  return (
    <>
      <PageHeader title="Change the plan" />
      <Loaded query={plan}>
        {(found) => (
          <Loaded query={bikes}>
            {({ items }) => (
              <PlanForm bikes={items} defaultValues={found} save={(input) => changePlan(id, input)} />
            )}
          </Loaded>
        )}
      </Loaded>
    </>
  );
}
