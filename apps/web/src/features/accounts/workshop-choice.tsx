import { Button, Heading, Stack } from '@chakra-ui/react';
import { useQueryClient } from '@tanstack/react-query';
import { useNavigate } from 'react-router-dom';
import { useSession } from '../../app/session';
import { sessionKey } from '../../app/session-key';
import { toastError } from '../../components/toaster';
import { postChosenWorkshop } from './calls';

/** For who belongs to more than one workshop: which one to work in. */
export function WorkshopChoice() {
  const { workshop, workshops } = useSession();
  const client = useQueryClient();
  const navigate = useNavigate();
  const choose = async (id: string) => {
    const session = await postChosenWorkshop(id);
    client.clear();
    client.setQueryData(sessionKey, session);
    await navigate('/');
  };
  if (workshops.length < 2) return null;
  return (
    <Stack as="section" gap="3" aria-labelledby="workshops">
      <Heading as="h2" size="lg" id="workshops">
        Your workshops
      </Heading>
      {workshops.map(({ id, name }) => (
        <Button
          key={id}
          variant="outline"
          justifyContent="space-between"
          disabled={id === workshop.id}
          onClick={() => void choose(id).catch(toastError)}
        >
          {name}
          <span>{id === workshop.id ? 'here now' : 'work here'}</span>
        </Button>
      ))}
    </Stack>
  );
}
