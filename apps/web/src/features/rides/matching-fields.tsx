import { SimpleGrid } from '@chakra-ui/react';
import type { CsvField, CsvInspection, CsvQuestion, KnownMatching } from '@halfpitch/ride-files';
import { optionsOf } from '../chains/options';
import { ChoiceSelect } from './choice-select';
import {
  clockWords,
  decimalWords,
  delimiterWords,
  distanceWords,
  fieldWords,
  orderWords,
  timeWords,
} from './csv-words';

const NO_COLUMN = 'none';
const header = [
  { value: 'yes', label: 'Names the columns' },
  { value: 'no', label: 'Is a ride' },
] as const;

interface MatchingFieldsProps {
  found: CsvInspection;
  onChange: (said: KnownMatching) => void;
}

/** Everything about a table that can be set right. What was not certain stands open until it is chosen. */
export function MatchingFields({ found: { matching, columns, questions }, onChange }: MatchingFieldsProps) {
  const settled = <V,>(about: CsvQuestion['about'], value: V) =>
    questions.some((question) => question.about === about) ? undefined : value;
  const timed = matching.columns.movingTime !== undefined || matching.columns.elapsedTime !== undefined;
  const listed = columns.map(({ index, header: name }) => ({ value: String(index), label: name }));
  const column = (field: CsvField) => {
    const needed = field === 'date' || field === 'distance';
    const at = matching.columns[field];
    const rest = { ...matching.columns };
    delete rest[field];
    return (
      <ChoiceSelect
        key={field}
        label={`${fieldWords[field]}: column`}
        options={needed ? listed : [{ value: NO_COLUMN, label: 'None' }, ...listed]}
        value={at === undefined ? (needed ? undefined : NO_COLUMN) : String(at)}
        onChange={(value) =>
          onChange({ columns: value === NO_COLUMN ? rest : { ...rest, [field]: Number(value) } })
        }
      />
    );
  };
  return (
    <SimpleGrid columns={{ base: 2, md: 3 }} gap="3">
      <ChoiceSelect
        label="Between columns"
        options={optionsOf(delimiterWords)}
        value={matching.delimiter}
        onChange={(delimiter) => onChange({ delimiter, columns: undefined })}
      />
      <ChoiceSelect
        label="First row"
        options={header}
        value={matching.hasHeader ? 'yes' : 'no'}
        onChange={(answer) => onChange({ hasHeader: answer === 'yes', columns: undefined })}
      />
      <ChoiceSelect
        label="Decimals"
        options={optionsOf(decimalWords)}
        value={settled('decimal', matching.decimal)}
        onChange={(decimal) => onChange({ decimal })}
      />
      <ChoiceSelect
        label="Dates"
        options={optionsOf(orderWords)}
        value={settled('dateOrder', matching.dateOrder)}
        onChange={(dateOrder) => onChange({ dateOrder })}
      />
      <ChoiceSelect
        label="Distances"
        options={optionsOf(distanceWords)}
        value={settled('distanceUnit', matching.distanceUnit)}
        onChange={(distanceUnit) => onChange({ distanceUnit })}
      />
      {timed && (
        <>
          <ChoiceSelect
            label="Plain times"
            options={optionsOf(timeWords)}
            value={settled('timeUnit', matching.timeUnit)}
            onChange={(timeUnit) => onChange({ timeUnit })}
          />
          <ChoiceSelect
            label="A time of 1:23"
            options={optionsOf(clockWords)}
            value={matching.shortClock}
            onChange={(shortClock) => onChange({ shortClock })}
          />
        </>
      )}
      {(Object.keys(fieldWords) as CsvField[]).map(column)}
    </SimpleGrid>
  );
}
