import { bikeInput } from '@halfpitch/contracts';
import type { Bike } from '@halfpitch/contracts';
import { useQuery } from '@tanstack/react-query';
import { useNavigate, useParams } from 'react-router-dom';
import { Form } from '../../components/form';
import { Loaded } from '../../components/loaded';
import { PageHeader } from '../../components/page-header';
import { SubmitButton } from '../../components/submit-button';
import { toastDone } from '../../components/toaster';
import { useChanged } from '../chains/follow-estimate';
import { bikeQuery } from './api/bike';
import { changeBike } from './api/change-bike';
import { BikeFields } from './bike-fields';

function BikeForm({ bike }: { bike: Bike }) {
  const navigate = useNavigate();
  const changed = useChanged();
  return (
    <Form
      schema={bikeInput}
      defaultValues={bike}
      onSubmit={async (values) => {
        await changeBike(bike.id, values);
        changed(null);
        toastDone('Saved.');
        await navigate(`/bikes/${bike.id}`, { replace: true });
      }}
    >
      <BikeFields />
      <SubmitButton alignSelf="flex-start">Save</SubmitButton>
    </Form>
  );
}

export function EditBike() {
  const { id = '' } = useParams();
  const bike = useQuery(bikeQuery(id));
  return (
    <>
      <PageHeader title="Edit the bike" lead={bike.data?.name} />
      <Loaded query={bike}>{(data) => <BikeForm bike={data} />}</Loaded>
    </>
  );
}
