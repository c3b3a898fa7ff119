import { Button, Flex, Text } from '@chakra-ui/react';
import { useFormContext, useWatch } from 'react-hook-form';
import { ruleMarks } from './rule-marks';

/** Where the pin stands on a 12-inch rule, put as % into the place that is still empty, else the last. */
export function RuleHelp() {
  const { setValue } = useFormContext();
  const values = useWatch({ name: 'reading.values' }) as (number | null)[];
  const put = (pct: number) => {
    const empty = values.indexOf(null);
    setValue(`reading.values.${empty < 0 ? values.length - 1 : empty}`, pct);
  };
  return (
    <div>
      <Text mb="2">Over 24 pitches, pull the chain tight. The pin stands:</Text>
      <Flex gap="2" wrap="wrap">
        {ruleMarks.map(({ label, pct }) => (
          <Button key={label} variant="outline" onClick={() => put(pct)}>
            {label}
          </Button>
        ))}
      </Flex>
    </div>
  );
}
