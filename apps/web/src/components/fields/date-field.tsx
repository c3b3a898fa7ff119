import { Input } from '@chakra-ui/react';
import { useFormContext } from 'react-hook-form';
import { FieldFrame } from './field-frame';
import type { FieldProps } from './field-frame';
import { useFieldError } from './use-field-error';

interface DateFieldProps extends FieldProps {
  /** First and last day that can be chosen, YYYY-MM-DD. */
  min?: string;
  max?: string;
}

/** A calendar day, YYYY-MM-DD, by the device's own calendar; empty is null. */
export function DateField({ name, min, max, ...frame }: DateFieldProps) {
  const { register } = useFormContext();
  const setValueAs = (value: string | null) => value || null;
  return (
    <FieldFrame error={useFieldError(name)} {...frame}>
      <Input
        type="date"
        min={min}
        max={max}
        width="auto"
        minWidth="11rem"
        {...register(name, { setValueAs })}
      />
    </FieldFrame>
  );
}
