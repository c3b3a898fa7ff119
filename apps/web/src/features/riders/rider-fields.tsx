import { TextField } from '../../components/fields/text-field';

/** What the desk keeps of a rider. */
export function RiderFields() {
  return (
    <>
      <TextField name="name" label="Name" autoComplete="off" required />
      <TextField
        name="email"
        label="E-mail"
        type="email"
        autoComplete="off"
        help="Reminders and the invitation go here."
        required
      />
      <TextField name="phone" label="Phone" type="tel" autoComplete="off" />
      <TextField
        name="notes"
        label="Notes"
        help="For the workshop only: the rider does not see them."
        lines={3}
      />
    </>
  );
}
