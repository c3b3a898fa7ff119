import { NativeSelect } from '@chakra-ui/react';
import { useFormContext } from 'react-hook-form';
import { FieldFrame } from './field-frame';
import type { FieldProps } from './field-frame';
import { useFieldError } from './use-field-error';

interface SelectFieldProps extends FieldProps {
  options: readonly { value: string; label: string }[];
  placeholder?: string;
}

/** A choice of many from a list: the device's own. */
export function SelectField({ name, options, placeholder, ...frame }: SelectFieldProps) {
  const { register } = useFormContext();
  return (
    <FieldFrame error={useFieldError(name)} {...frame}>
      <NativeSelect.Root>
        <NativeSelect.Field placeholder={placeholder} {...register(name)}>
          {options.map(({ value, label }) => (
            <option key={value} value={value}>
              {label}
            </option>
          ))}
        </NativeSelect.Field>
        <NativeSelect.Indicator />
      </NativeSelect.Root>
    </FieldFrame>
  );
}
