import { Link, Stack, Text } from '@chakra-ui/react';
import { useQuery } from '@tanstack/react-query';
import { Link as RouterLink } from 'react-router-dom';
import { useSession } from '../../app/session';
import { Loaded } from '../../components/loaded';
import { PageHeader } from '../../components/page-header';
import { settingsQuery } from '../workshop/api/settings';
import { modelQuery } from './api/model';
import { HowDistance } from './how-distance';
import { HowElongation } from './how-elongation';
import { HowNarrow } from './how-narrow';
import { HowTreatment } from './how-treatment';
import { HowWindow } from './how-window';
import { OwnNarrowing } from './own-narrowing';

/** How the estimates come about, in plain words and with this workshop's own figures. */
export function How() {
  const { workshop, riderId, role } = useSession();
  const query = useQuery(settingsQuery);
  const model = useQuery(modelQuery);
  return (
    <>
      <PageHeader
        title="How we estimate"
        lead={`What ${workshop.name} works out from rides, readings and treatments, with the figures it uses.`}
      />
      <Loaded query={query} rows={4} height="12rem">
        {(settings) => (
          <Stack gap="6" maxWidth="52rem">
            <HowDistance factors={settings.factors} />
            <HowTreatment limits={settings.calendarLimitDays} model={model} />
            <HowElongation model={model} />
            <HowWindow policy={settings.reminderPolicy} model={model} />
            <HowNarrow />
            {riderId && <OwnNarrowing />}
            {role !== 'rider' && (
              <Text>
                How often the windows held so far:{' '}
                <Link asChild>
                  <RouterLink to="/accuracy">how right we were</RouterLink>
                </Link>
              </Text>
            )}
          </Stack>
        )}
      </Loaded>
    </>
  );
}
