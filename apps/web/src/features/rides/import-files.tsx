import { Button, Checkbox, Stack, Text } from '@chakra-ui/react';
import { MAX_IMPORT_BYTES } from '@halfpitch/contracts';
import type { Bike, Surface, Weather } from '@halfpitch/contracts';
import { useState } from 'react';
import { Link } from 'react-router-dom';
import { EmptyState } from '../../components/empty-state';
import { Tiles } from '../../components/fields/tiles';
import { FileDrop } from '../../components/file-drop';
import { Loaded } from '../../components/loaded';
import { PageHeader } from '../../components/page-header';
import { surfaceWords, weatherWords } from '../../components/trade-words';
import { useWhoseBikes } from '../bikes/use-whose-bikes';
import { optionsOf } from '../chains/options';
import { ImportList } from './import-list';
import { SentBefore } from './sent-before';
import { UnsentNotice } from './unsent-notice';
import { useUnsent } from './use-unsent';
import { useUploads } from './use-uploads';
import { usualSurface } from './usual-rides';

const MEGABYTES = MAX_IMPORT_BYTES / 1024 / 1024;

function Importer({ bikes, first }: { bikes: Bike[]; first: Bike }) {
  const [bikeId, setBikeId] = useState(first.id);
  const bike = bikes.find(({ id }) => id === bikeId) ?? first;
  const [ground, setGround] = useState<Surface | null>(null);
  const surface = ground ?? usualSurface(bike, []);
  const [weather, setWeather] = useState<Weather>('unknown');
  const [anySport, setAnySport] = useState(false);
  const { uploads, add, send, match, leave } = useUploads();
  const { remaining, forget } = useUnsent(first.riderId, uploads);
  return (
    <Stack gap="6">
      <UnsentNotice names={remaining} onForget={forget} />
      {bikes.length > 1 && (
        <Tiles
          name="bike"
          label="Ridden on"
          options={bikes.map(({ id, name }) => ({ value: id, label: name }))}
          value={bikeId}
          onChange={setBikeId}
          minTileWidth="8rem"
        />
      )}
      <Tiles
        name="surface"
        label="Ground, where the file does not say"
        options={optionsOf(surfaceWords)}
        value={surface}
        onChange={setGround}
        minTileWidth="4.75rem"
      />
      <Tiles
        name="weather"
        label="Weather, where the file does not say"
        options={optionsOf(weatherWords)}
        value={weather}
        onChange={setWeather}
        minTileWidth="3.75rem"
      />
      <Checkbox.Root
        checked={anySport}
        onCheckedChange={({ checked }) => setAnySport(checked === true)}
        minHeight="11"
      >
        <Checkbox.HiddenInput />
        <Checkbox.Control borderColor="border.control" />
        <Checkbox.Label>Count recordings that name another sport, or none, as rides too</Checkbox.Label>
      </Checkbox.Root>
      <FileDrop
        label="Drop ride files here, or choose them"
        help={`GPX, TCX, FIT and CSV, also packed as .zip or .gz; each up to ${MEGABYTES} MB`}
        accept=".gpx,.tcx,.fit,.csv,.tsv,.txt,.zip,.gz"
        multiple
        onFiles={(files) =>
          add(files, { bikeId, surface, weather, otherSports: anySport ? 'take' : 'leave' })
        }
      />
      <ImportList uploads={uploads} onSend={send} onMatch={match} onLeave={leave} />
      <SentBefore riderId={first.riderId} uploads={uploads} />
    </Stack>
  );
}

/** Many rides at once, from files. */
export function ImportFiles() {
  const { bikeId, bikes, isNamed } = useWhoseBikes();
  if (!isNamed) return <EmptyState title="Whose rides are they?">Open the rider’s bike first.</EmptyState>;
  return (
    <>
      <PageHeader
        title="Add rides from files"
        lead="A ride that is there already is not counted twice, whichever device or format it came from."
      />
      <Loaded query={bikes}>
        {({ items }) => {
          const first = items.find(({ id }) => id === bikeId) ?? items[0];
          if (first) return <Importer bikes={items} first={first} />;
          return (
            <EmptyState
              title="No bike yet"
              action={
                <Button asChild>
                  <Link to="/bikes/new">Add a bike</Link>
                </Button>
              }
            >
              <Text>Rides belong to a bike: add yours first.</Text>
            </EmptyState>
          );
        }}
      </Loaded>
    </>
  );
}
