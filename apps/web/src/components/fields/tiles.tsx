import { chakra, Fieldset, SimpleGrid } from '@chakra-ui/react';
import type { LucideIcon } from 'lucide-react';
import { useId } from 'react';

export interface TileOption<V extends string> {
  value: V;
  label: string;
  /** A few words below: "counts double". */
  hint?: string;
  icon?: LucideIcon;
}

export interface TilesProps<V extends string> {
  name: string;
  label: string;
  options: readonly TileOption<V>[];
  value: V | undefined;
  onChange: (value: V) => void;
  error?: string;
  /** The narrowest a tile gets. */
  minTileWidth?: string;
}

const Tile = chakra('label', {
  base: {
    position: 'relative',
    display: 'flex',
    flexDirection: 'column',
    alignItems: 'center',
    justifyContent: 'center',
    gap: 1,
    minHeight: '16',
    px: 2,
    py: 2,
    textAlign: 'center',
    lineHeight: '1.2',
    bg: 'bg.panel',
    borderWidth: '1px',
    borderColor: 'border.control',
    borderRadius: 'l2',
    cursor: 'pointer',
    _hover: { bg: 'bg.muted' },
    '&:has(:checked)': {
      bg: 'steel.subtle',
      color: 'steel.fg',
      fontWeight: 'semibold',
      borderColor: 'steel.solid',
      boxShadow: 'inset 0 0 0 2px var(--hp-colors-steel-solid)',
    },
    '&:has(:focus-visible)': { outline: '3px solid', outlineColor: 'steel.solid', outlineOffset: '2px' },
  },
});

/** Few choices, each a target for a thumb or a glove: one tap and it is chosen. */
export function Tiles<V extends string>(props: TilesProps<V>) {
  const { name, label, options, value, onChange, error, minTileWidth = '5.5rem' } = props;
  const group = useId();
  return (
    <Fieldset.Root invalid={Boolean(error)} spaceY="1.5">
      <Fieldset.Legend fontSize="md" fontWeight="semibold" color="fg">
        {label}
      </Fieldset.Legend>
      <SimpleGrid minChildWidth={minTileWidth} gap="2" width="full">
        {options.map((option) => (
          <Tile key={option.value}>
            <chakra.input
              type="radio"
              srOnly
              name={`${group}-${name}`}
              value={option.value}
              checked={option.value === value}
              onChange={() => onChange(option.value)}
            />
            {option.icon && <option.icon size={26} strokeWidth={1.5} aria-hidden="true" />}
            <span>{option.label}</span>
            {option.hint && (
              <chakra.span textStyle="sm" fontWeight="normal" color="fg.muted">
                {option.hint}
              </chakra.span>
            )}
          </Tile>
        ))}
      </SimpleGrid>
      <Fieldset.ErrorText>{error}</Fieldset.ErrorText>
    </Fieldset.Root>
  );
}
