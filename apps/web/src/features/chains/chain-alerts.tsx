import { List, Stack, Text } from '@chakra-ui/react';
import type { Alert, Regime } from '@halfpitch/contracts';
import { useFormat } from '../../app/use-format';
import { Notice } from '../../components/notice';
import { alertWords } from './alert-words';

/** What cannot wait, what to do about it, and with what care. */
export function ChainAlerts({ alerts, regime }: { alerts: readonly Alert[]; regime: Regime }) {
  const { today } = useFormat();
  if (alerts.length === 0) return null;
  return (
    <Stack gap="3">
      {alerts.map((alert) => {
        const { title, steps, caution } = alertWords(alert, regime, today);
        return (
          <Notice key={`${alert.code}-${alert.day}-${String(alert.data.readingId ?? '')}`} kind="caution">
            <Text fontWeight="semibold">{title}</Text>
            <List.Root as="ol" listStyle="none" mt="1" gap="1">
              {steps.map((step) => (
                <List.Item key={step}>{step}</List.Item>
              ))}
            </List.Root>
            {caution && (
              <Text mt="2" color="fg.muted" textStyle="sm">
                {caution}
              </Text>
            )}
          </Notice>
        );
      })}
    </Stack>
  );
}
