import { Box, Stack } from '@chakra-ui/react';
import { workshopSettings } from '@halfpitch/contracts';
import type { WorkshopSettings } from '@halfpitch/contracts';
import { useQueryClient } from '@tanstack/react-query';
import { sessionKey } from '../../app/session-key';
import { Form } from '../../components/form';
import { SubmitButton } from '../../components/submit-button';
import { toastDone } from '../../components/toaster';
import { changeSettings, settingsQuery } from './api/settings';
import { BenchSettings } from './bench-settings';
import { FactorSettings } from './factor-settings';
import { LimitSettings } from './limit-settings';
import { NameSettings } from './name-settings';
import { PolicySettings } from './policy-settings';
import { WetShareSettings } from './wet-share-settings';

/** All settings as one form with one button, always in reach. */
export function SettingsForm({ settings }: { settings: WorkshopSettings }) {
  const client = useQueryClient();
  return (
    <Form
      schema={workshopSettings}
      defaultValues={settings}
      onSubmit={async (values) => {
        client.setQueryData(settingsQuery.queryKey, await changeSettings(values));
        for (const queryKey of [sessionKey, ['workload']]) void client.invalidateQueries({ queryKey });
        toastDone('The settings are saved.');
      }}
    >
      <Stack gap="6">
        <NameSettings />
        <FactorSettings />
        <WetShareSettings />
        <LimitSettings />
        <PolicySettings />
        <BenchSettings />
        <Box position="sticky" bottom={{ base: '5rem', md: '0' }} py="4" bg="bg" borderTopWidth="1px">
          <SubmitButton>Save the settings</SubmitButton>
        </Box>
      </Stack>
    </Form>
  );
}
