import { Switch } from '@chakra-ui/react';
import { useController } from 'react-hook-form';

/** On or off, bound to the form around it. */
export function SwitchField({ name, label }: { name: string; label: string }) {
  const { field } = useController({ name });
  return (
    <Switch.Root
      checked={Boolean(field.value)}
      onCheckedChange={({ checked }) => field.onChange(checked)}
      minHeight="11"
    >
      <Switch.HiddenInput onBlur={field.onBlur} />
      <Switch.Control>
        <Switch.Thumb />
      </Switch.Control>
      <Switch.Label textStyle="md">{label}</Switch.Label>
    </Switch.Root>
  );
}
