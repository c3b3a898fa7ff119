import { Box, Grid } from '@chakra-ui/react';
import { useQuery } from '@tanstack/react-query';
import { Loaded } from '../../components/loaded';
import { PageHeader } from '../../components/page-header';
import { settingsQuery } from './api/settings';
import { SettingsForm } from './settings-form';
import { StaffPanel } from './staff-panel';

/** What the owner sets, and who works here. */
export function Workshop() {
  const query = useQuery(settingsQuery);
  return (
    <>
      <PageHeader
        title="Workshop"
        lead="What every estimate and reminder here is worked out with. Each chain is estimated anew as soon as you save."
      />
      <Grid
        templateColumns={{ base: 'minmax(0, 1fr)', xl: 'minmax(0, 1fr) 24rem' }}
        gap="8"
        alignItems="start"
      >
        <Loaded query={query} rows={4} height="12rem">
          {(settings) => <SettingsForm settings={settings} />}
        </Loaded>
        <Box>
          <StaffPanel />
        </Box>
      </Grid>
    </>
  );
}
