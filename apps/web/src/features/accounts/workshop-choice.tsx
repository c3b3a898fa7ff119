import { Button, Heading, Stack } from '@chakra-ui/react';
import { useSession } from '../../app/session';
import { useChooseWorkshop } from '../../app/workshop-choice';
import { toastError } from '../../components/toaster';

/** For who belongs to more than one workshop: which one to work in. */
export function WorkshopChoice() {
  const { workshop, workshops } = useSession();
  const choose = useChooseWorkshop();
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
