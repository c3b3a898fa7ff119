import { acceptInvitation } from '@halfpitch/contracts';
import type { Role } from '@halfpitch/contracts';
import { useQuery } from '@tanstack/react-query';
import { useParams } from 'react-router-dom';
import { ErrorState } from '../../components/error-state';
import { TextField } from '../../components/fields/text-field';
import { Form } from '../../components/form';
import { LoadingState } from '../../components/loading-state';
import { PageHeader } from '../../components/page-header';
import { SubmitButton } from '../../components/submit-button';
import { postInvitation } from './calls';
import { useEnter } from './entry';
import { invitationQuery } from './invitation-query';
import { NewPasswordField } from './new-password-field';

const roleWords: Record<Role, string> = {
  rider: 'to follow your chains as a rider',
  mechanic: 'to work at the bench',
  desk: 'to work at the desk',
  owner: 'to help run it, as an owner',
};

/** Where an invitation's link leads. */
export function Invitation() {
  const { token = '' } = useParams();
  const { data: view, error, refetch } = useQuery(invitationQuery(token));
  const enter = useEnter();
  if (error) return <ErrorState error={error} onRetry={() => void refetch()} />;
  if (!view) return <LoadingState rows={3} />;
  return (
    <>
      <PageHeader
        title={`Welcome to ${view.workshopName}`}
        lead={`You are invited ${roleWords[view.role]}. You sign in as ${view.email}.`}
      />
      <Form
        schema={acceptInvitation}
        defaultValues={{ name: view.name, password: '' }}
        onSubmit={async (values) => {
          await postInvitation(token, values);
          await enter();
        }}
      >
        <TextField name="name" label="Your name" autoComplete="name" />
        {view.hasAccount ? (
          <TextField
            name="password"
            label="Your password"
            type="password"
            autoComplete="current-password"
            help="This address has an account already: give its password."
          />
        ) : (
          <NewPasswordField label="Choose a password" />
        )}
        <SubmitButton>Accept the invitation</SubmitButton>
      </Form>
    </>
  );
}
