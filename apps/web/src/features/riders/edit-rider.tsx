import { Box, Button, Flex } from '@chakra-ui/react';
import { riderInput } from '@halfpitch/contracts';
import type { Rider } from '@halfpitch/contracts';
import { useQuery, useQueryClient } from '@tanstack/react-query';
import { Link as RouterLink, useNavigate, useParams } from 'react-router-dom';
import { Form } from '../../components/form';
import { Loaded } from '../../components/loaded';
import { PageHeader } from '../../components/page-header';
import { SubmitButton } from '../../components/submit-button';
import { toastDone } from '../../components/toaster';
import { changeRider, riderQuery } from './api/rider';
import { RiderFields } from './rider-fields';

function EditForm({ rider }: { rider: Rider }) {
  const client = useQueryClient();
  const navigate = useNavigate();
  const { id, name, email, phone, notes } = rider;
  return (
    <Form
      schema={riderInput}
      defaultValues={{ name, email, phone, notes }}
      onSubmit={async (values) => {
        await changeRider(id, values);
        await client.invalidateQueries({ queryKey: ['riders'] });
        toastDone('Saved.');
        await navigate(`/riders/${id}`, { replace: true });
      }}
    >
      <RiderFields />
      <Flex gap="3" wrap="wrap">
        <SubmitButton>Save</SubmitButton>
        <Button asChild variant="outline">
          <RouterLink to={`/riders/${id}`}>Leave it as it was</RouterLink>
        </Button>
      </Flex>
    </Form>
  );
}

export function EditRider() {
  const { id = '' } = useParams();
  const query = useQuery(riderQuery(id));
  return (
    <Box maxWidth="34rem">
      <PageHeader title="Change the rider’s details" lead={query.data?.name} />
      <Loaded query={query}>{(rider) => <EditForm rider={rider} />}</Loaded>
    </Box>
  );
}
