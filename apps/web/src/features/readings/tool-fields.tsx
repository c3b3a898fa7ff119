import type { ReadingMethod } from '@halfpitch/contracts';
import { useEffect } from 'react';
import { useFormContext, useWatch } from 'react-hook-form';
import { ChoiceTiles } from '../../components/fields/choice-tiles';
import { methodWords } from '../../components/trade-words';
import { optionsOf } from '../chains/options';
import type { Entry } from './reading-form';
import { entriesOf } from './reading-form';

const entryWords: Record<Entry, string> = {
  inch: 'Inch fractions over 12 in',
  mm: 'Millimetres',
  pct: 'Percent',
  steps: 'What goes in',
};

/** Which tool, and how its answer is entered where there is a choice. */
export function ToolFields() {
  const { setValue, getValues, clearErrors } = useFormContext();
  const method = useWatch({ name: 'method' }) as ReadingMethod;
  const possible = entriesOf[method];
  useEffect(() => {
    clearErrors();
    if (!possible.includes(getValues('entry') as Entry)) setValue('entry', possible[0]);
  }, [possible, setValue, getValues, clearErrors]);
  return (
    <>
      <ChoiceTiles name="method" label="Tool" options={optionsOf(methodWords)} minTileWidth="6.5rem" />
      {possible.length > 1 && (
        <ChoiceTiles
          name="entry"
          label="Read in"
          options={possible.map((value) => ({ value, label: entryWords[value] }))}
          minTileWidth="8rem"
        />
      )}
    </>
  );
}
