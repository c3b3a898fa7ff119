import { useController } from 'react-hook-form';
import { Tiles } from './tiles';
import type { TilesProps } from './tiles';

type ChoiceTilesProps = Omit<TilesProps<string>, 'value' | 'onChange' | 'error'>;

/** Tiles bound to the form around them. */
export function ChoiceTiles({ name, ...tiles }: ChoiceTilesProps) {
  const { field, fieldState } = useController({ name });
  return (
    <Tiles
      {...tiles}
      name={name}
      value={field.value as string | undefined}
      onChange={field.onChange}
      error={fieldState.error && (fieldState.error.message || 'Choose one.')}
    />
  );
}
