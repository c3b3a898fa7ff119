import { Group, Input, Text } from '@chakra-ui/react';
import { useState } from 'react';
import { useController } from 'react-hook-form';
import { FieldFrame } from './field-frame';
import type { FieldProps } from './field-frame';
import { keepNumber, writeNumber } from './number-text';

export interface NumberFieldProps extends FieldProps {
  /** Shown behind the number: km, %, min. */
  unit?: string;
  /** What is kept for one of the unit shown, for example 1,000 for kilometres kept as metres. */
  scale?: number;
  /** Places shown. */
  decimals?: number;
  /** Kept as a whole number. */
  whole?: boolean;
  placeholder?: string;
  autoFocus?: boolean;
}

/** A number typed with any keyboard, point or comma; kept as number, as null when empty, as NaN when it is none. */
export function NumberField(props: NumberFieldProps) {
  const { name, unit, scale = 1, decimals = 2, whole = false, placeholder, autoFocus, ...frame } = props;
  const {
    field: { ref, value, onChange, onBlur },
    fieldState: { error },
  } = useController({ name });
  const kept = value as number | null | undefined;
  const [typed, setTyped] = useState({ text: '', value: kept });
  const written =
    kept === null || kept === undefined || Number.isNaN(kept) ? '' : writeNumber(kept / scale, decimals);
  const text = Object.is(typed.value, kept) && typed.text !== '' ? typed.text : written;
  const read = (next: string) => {
    const number = keepNumber(next, scale, whole);
    setTyped({ text: next, value: number });
    onChange(number);
  };
  return (
    <FieldFrame error={error && (error.message || 'Give a number.')} {...frame}>
      <Group gap="2">
        <Input
          ref={ref}
          name={name}
          inputMode="decimal"
          autoComplete="off"
          value={text}
          placeholder={placeholder}
          autoFocus={autoFocus}
          width="9rem"
          fontVariantNumeric="tabular-nums"
          onChange={(event) => read(event.target.value)}
          onBlur={onBlur}
        />
        {unit && <Text color="fg.muted">{unit}</Text>}
      </Group>
    </FieldFrame>
  );
}
