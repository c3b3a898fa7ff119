import { Input, Textarea } from '@chakra-ui/react';
import { useFormContext } from 'react-hook-form';
import { FieldFrame } from './field-frame';
import type { FieldProps } from './field-frame';
import { useFieldError } from './use-field-error';

interface TextFieldProps extends FieldProps {
  type?: 'text' | 'email' | 'password' | 'tel' | 'search';
  autoComplete?: string;
  placeholder?: string;
  /** More than one: a field of that many lines. */
  lines?: number;
}

/** One line of text, or several. */
export function TextField({
  name,
  type = 'text',
  autoComplete,
  placeholder,
  lines = 1,
  ...frame
}: TextFieldProps) {
  const { register } = useFormContext();
  const error = useFieldError(name);
  const shared = { autoComplete, placeholder, ...register(name) };
  return (
    <FieldFrame error={error} {...frame}>
      {lines > 1 ? <Textarea rows={lines} autoresize {...shared} /> : <Input type={type} {...shared} />}
    </FieldFrame>
  );
}
