import { Checkbox } from '@chakra-ui/react';
import { useController } from 'react-hook-form';

/** The reading of the new chain, from which its wear is counted. */
export function BaselineField() {
  const { field } = useController({ name: 'baseline' });
  return (
    <Checkbox.Root
      name={field.name}
      checked={field.value as boolean}
      onCheckedChange={({ checked }) => field.onChange(checked === true)}
      onBlur={field.onBlur}
      minHeight="11"
    >
      <Checkbox.HiddenInput />
      <Checkbox.Control borderColor="border.control" />
      <Checkbox.Label>The chain was new when this was measured</Checkbox.Label>
    </Checkbox.Root>
  );
}
