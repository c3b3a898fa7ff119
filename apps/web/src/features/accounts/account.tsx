import { Button, Flex, Separator, Stack } from '@chakra-ui/react';
import { Link } from 'react-router-dom';
import { useSession, useSignOut } from '../../app/session';
import { LookTiles } from '../../components/look-tiles';
import { PageHeader } from '../../components/page-header';
import { toastError } from '../../components/toaster';
import { PasswordSettings } from './password-settings';
import { PersonSettings } from './person-settings';
import { WorkshopChoice } from './workshop-choice';

/** One's own settings. */
export function Account() {
  const { account, riderId, workshops } = useSession();
  const signOut = useSignOut();
  const leave = (where: 'here' | 'everywhere') => void signOut(where).catch(toastError);
  return (
    <>
      <PageHeader title="Account" lead={account.email} />
      <Stack gap="8" maxWidth="30rem" separator={<Separator />}>
        <PersonSettings />
        <LookTiles />
        {workshops.length > 1 && <WorkshopChoice />}
        <PasswordSettings />
        {riderId && (
          <Button asChild variant="outline" alignSelf="flex-start">
            <Link to="/account/calendar">In your calendar</Link>
          </Button>
        )}
        <Button asChild variant="outline" alignSelf="flex-start">
          <Link to="/account/tokens">Tokens for scripts</Link>
        </Button>
        <Flex gap="3" wrap="wrap">
          <Button onClick={() => leave('here')} variant="outline">
            Sign out
          </Button>
          <Button onClick={() => leave('everywhere')} variant="outline">
            Sign out everywhere
          </Button>
        </Flex>
      </Stack>
    </>
  );
}
