import { Field, NativeSelect } from '@chakra-ui/react';

interface ChoiceSelectProps<V extends string> {
  label: string;
  options: readonly { value: V; label: string }[];
  /** Undefined while nothing is chosen. */
  value: V | undefined;
  onChange: (value: V) => void;
}

/** A choice from a list, outside of a form. */
export function ChoiceSelect<V extends string>({ label, options, value, onChange }: ChoiceSelectProps<V>) {
  const open = value === undefined;
  return (
    <Field.Root invalid={open}>
      <Field.Label>{label}</Field.Label>
      <NativeSelect.Root>
        <NativeSelect.Field value={value ?? ''} onChange={(event) => onChange(event.target.value as V)}>
          {open && <option value="">Choose</option>}
          {options.map((option) => (
            <option key={option.value} value={option.value}>
              {option.label}
            </option>
          ))}
        </NativeSelect.Field>
        <NativeSelect.Indicator />
      </NativeSelect.Root>
    </Field.Root>
  );
}
