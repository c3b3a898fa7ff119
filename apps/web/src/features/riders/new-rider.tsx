import { Box } from '@chakra-ui/react';
import { riderInput } from '@halfpitch/contracts';
import { useQueryClient } from '@tanstack/react-query';
import { useNavigate } from 'react-router-dom';
import { Form } from '../../components/form';
import { PageHeader } from '../../components/page-header';
import { SubmitButton } from '../../components/submit-button';
import { toastDone } from '../../components/toaster';
import { addRider } from './api/rider';
import { RiderFields } from './rider-fields';

export function NewRider() {
  const client = useQueryClient();
  const navigate = useNavigate();
  return (
    <Box maxWidth="34rem">
      <PageHeader
        title="Add a rider"
        lead="Next you add their bikes, and invite them if they want to log rides."
      />
      <Form
        schema={riderInput}
        defaultValues={{ name: '', email: '', phone: '', notes: '' }}
        onSubmit={async (values) => {
          const rider = await addRider(values);
          await client.invalidateQueries({ queryKey: ['riders'] });
          toastDone(`${rider.name} is added.`);
          await navigate(`/riders/${rider.id}`, { replace: true });
        }}
      >
        <RiderFields />
        <SubmitButton alignSelf="flex-start">Add the rider</SubmitButton>
      </Form>
    </Box>
  );
}
