import { Field } from '@chakra-ui/react';
import type { ReactNode } from 'react';

/** What every field of a form can be given. */
export interface FieldProps {
  /** The value's path in the form, as in the contract. */
  name: string;
  label: string;
  help?: ReactNode;
  required?: boolean;
  disabled?: boolean;
}

interface FieldFrameProps extends Omit<FieldProps, 'name'> {
  error?: string;
  children: ReactNode;
}

/** Label above, then the control, then help and what is wrong; tied together for screen readers. */
export function FieldFrame({ label, help, required, disabled, error, children }: FieldFrameProps) {
  return (
    <Field.Root invalid={Boolean(error)} required={required} disabled={disabled}>
      <Field.Label>
        {label}
        <Field.RequiredIndicator />
      </Field.Label>
      {children}
      {help && <Field.HelperText>{help}</Field.HelperText>}
      <Field.ErrorText>{error}</Field.ErrorText>
    </Field.Root>
  );
}
