import { Heading, SimpleGrid, Stack, Text } from '@chakra-ui/react';
import { surfaces } from '@halfpitch/contracts';
import { Fragment } from 'react';
import { NumberField } from '../../components/fields/number-field';
import { Panel } from '../../components/panel';
import { surfaceWords, weatherWords } from '../../components/trade-words';

const weathers = ['dry', 'damp', 'wet', 'mud'] as const;

interface Row {
  path: string;
  word: string;
}

function FactorRows({ title, rows }: { title: string; rows: Row[] }) {
  return (
    <div>
      <Heading as="h3" size="md" mb="3">
        {title}
      </Heading>
      <SimpleGrid columns={2} columnGap="5" rowGap="4" maxWidth="24rem">
        {rows.map(({ path, word }) => (
          <Fragment key={path}>
            <NumberField name={`${path}.lube`} label={`${word}: treatment`} unit="×" />
            <NumberField name={`${path}.wear`} label={`${word}: wear`} unit="×" />
          </Fragment>
        ))}
      </SimpleGrid>
    </div>
  );
}

/** How much a kilometre counts for, by surface and weather. */
export function FactorSettings() {
  return (
    <Panel title="What a kilometre counts for">
      <Text color="fg.muted" mb="5" maxWidth="42rem">
        A kilometre on a dry, clean road counts once. Surface and weather multiply: gravel 1.5 × wet 2 makes
        3. The first figure is for how fast wax or oil is used up, the second for how fast the chain
        lengthens.
      </Text>
      <Stack gap="7">
        <FactorRows
          title="Surface"
          rows={surfaces.map((one) => ({ path: `factors.surface.${one}`, word: surfaceWords[one] }))}
        />
        <FactorRows
          title="Weather"
          rows={weathers.map((one) => ({ path: `factors.weather.${one}`, word: weatherWords[one] }))}
        />
      </Stack>
    </Panel>
  );
}
