import { useFormat } from '../../app/use-format';
import { EmptyState } from '../../components/empty-state';
import { Loaded } from '../../components/loaded';
import { PageHeader } from '../../components/page-header';
import { useWhoseBikes } from '../bikes/use-whose-bikes';
import { addPlan } from './api/add-plan';
import { PlanForm } from './plan-form';

/** Plans riding on a bike, `?bike=`. */
export function NewPlan() {
  const { today } = useFormat();
  const { bikeId, bikes, isNamed } = useWhoseBikes();
  return (
    <>
      <PageHeader title="Plan riding" lead="A tour or a training week: will the chain last through it?" />
      {isNamed ? (
        <Loaded query={bikes}>
          {({ items }) =>
            items.length === 0 ? (
              <EmptyState title="There is no bike yet">Add a bike and its chain first.</EmptyState>
            ) : (
              <PlanForm
                bikes={items}
                defaultValues={{ bikeId: bikeId ?? items[0]!.id, name: '', from: today, to: today }}
                save={addPlan}
              />
            )
          }
        </Loaded>
      ) : (
        <EmptyState title="Which bike is it?">Open the bike first and plan from there.</EmptyState>
      )}
    </>
  );
}
