import { List, Stack, Text } from '@chakra-ui/react';
import type { ReadingMethod } from '@halfpitch/contracts';
import { useWatch } from 'react-hook-form';
import { Notice } from '../../components/notice';
import { MeasuringPicture } from './measuring-picture';
import { MEASURING_ANYWHERE, MEASURING_CAUTION, measuringSteps } from './measuring-words';

/** How the chosen tool is set and read, and with what care. */
export function HowToMeasure() {
  const method = useWatch({ name: 'method' }) as ReadingMethod;
  return (
    <Stack gap="4">
      <MeasuringPicture method={method} />
      <List.Root as="ol" ps="5" gap="1">
        {measuringSteps[method].map((step) => (
          <List.Item key={step}>{step}</List.Item>
        ))}
      </List.Root>
      <List.Root ps="5" gap="1" color="fg.muted">
        {MEASURING_ANYWHERE.map((rule) => (
          <List.Item key={rule}>{rule}</List.Item>
        ))}
      </List.Root>
      <Notice kind="caution">
        <Text textStyle="sm">{MEASURING_CAUTION}</Text>
      </Notice>
    </Stack>
  );
}
