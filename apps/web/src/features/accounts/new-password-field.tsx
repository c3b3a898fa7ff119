import { TextField } from '../../components/fields/text-field';

export function NewPasswordField({ label = 'Password' }: { label?: string }) {
  return (
    <TextField
      name="password"
      label={label}
      type="password"
      autoComplete="new-password"
      help="At least 10 characters; a few words together are easy to keep in mind."
    />
  );
}
