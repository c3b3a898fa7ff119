import { newBike } from '@halfpitch/contracts';
import { useNavigate, useSearchParams } from 'react-router-dom';
import { useSession } from '../../app/session';
import { EmptyState } from '../../components/empty-state';
import { Form } from '../../components/form';
import { PageHeader } from '../../components/page-header';
import { SubmitButton } from '../../components/submit-button';
import { toastDone } from '../../components/toaster';
import { useChanged } from '../chains/follow-estimate';
import { addBike } from './api/add-bike';
import { BikeFields } from './bike-fields';

/** A new bike of one's own; staff name its rider in the address, `?rider=`. */
export function NewBike() {
  const session = useSession();
  const [search] = useSearchParams();
  const navigate = useNavigate();
  const changed = useChanged();
  const riderId = session.riderId ?? search.get('rider');
  if (!riderId)
    return (
      <EmptyState title="Whose bike is it?">Open the rider first and add the bike from there.</EmptyState>
    );
  return (
    <>
      <PageHeader title="Add a bike" lead="Next you add the chain that is on it." />
      <Form
        schema={newBike}
        defaultValues={{ riderId, name: '', kind: 'road', speeds: 11, brakeFluid: 'none', notes: '' }}
        onSubmit={async (values) => {
          const bike = await addBike(values);
          changed(null);
          toastDone(`${bike.name} is added.`);
          await navigate(`/chains/new?bike=${bike.id}`, { replace: true });
        }}
      >
        <BikeFields />
        <SubmitButton alignSelf="flex-start">Add the bike</SubmitButton>
      </Form>
    </>
  );
}
