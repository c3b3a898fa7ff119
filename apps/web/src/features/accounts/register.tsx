import { Link } from '@chakra-ui/react';
import { registerWorkshop } from '@halfpitch/contracts';
import { Link as RouterLink } from 'react-router-dom';
import { MoreParts } from '../../app/theme/more-provider';
import { Form } from '../../components/form';
import { PageHeader } from '../../components/page-header';
import { SubmitButton } from '../../components/submit-button';
import { SelectField } from '../../components/fields/select-field';
import { TextField } from '../../components/fields/text-field';
import { postWorkshop } from './calls';
import { useEnter } from './entry';
import { NewPasswordField } from './new-password-field';

const zones = [...new Set(['UTC', ...Intl.supportedValuesOf('timeZone')])].sort();
const zoneOptions = zones.map((value) => ({ value, label: value.replaceAll('_', ' ') }));
const here = Intl.DateTimeFormat().resolvedOptions().timeZone;

/** A new workshop registers itself; who does it becomes its owner. */
export function Register() {
  const enter = useEnter();
  return (
    <MoreParts>
      <PageHeader
        title="Register a workshop"
        lead="You become its owner, and invite staff and riders afterwards."
      />
      <Form
        schema={registerWorkshop}
        defaultValues={{
          workshopName: '',
          town: '',
          timeZone: zones.includes(here) ? here : 'UTC',
          name: '',
          email: '',
          password: '',
        }}
        onSubmit={async (values) => {
          await postWorkshop(values);
          await enter();
        }}
      >
        <TextField name="workshopName" label="Name of the workshop" autoComplete="organization" />
        <TextField name="town" label="Town" autoComplete="address-level2" />
        <SelectField
          name="timeZone"
          label="Time zone"
          help="Days begin and end by it."
          options={zoneOptions}
        />
        <TextField name="name" label="Your name" autoComplete="name" />
        <TextField name="email" label="Your e-mail" type="email" autoComplete="username" />
        <NewPasswordField />
        <SubmitButton>Register the workshop</SubmitButton>
        <Link asChild alignSelf="flex-start">
          <RouterLink to="/sign-in">Sign in instead</RouterLink>
        </Link>
      </Form>
    </MoreParts>
  );
}
