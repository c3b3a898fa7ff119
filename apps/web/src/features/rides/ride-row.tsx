import { Box, Flex, IconButton, Text } from '@chakra-ui/react';
import type { Ride } from '@halfpitch/contracts';
import { Pencil, Trash2 } from 'lucide-react';
import { Link } from 'react-router-dom';
import { useFormat } from '../../app/use-format';
import { surfaceWords, weatherWords } from '../../components/trade-words';
import { useRemoveRide } from './use-remove-ride';

/** One ride with the two things done to it. */
export function RideRow({ ride, bikeName }: { ride: Ride; bikeName?: string }) {
  const { day, distance } = useFormat();
  const remove = useRemoveRide();
  const name = `${distance(ride.distanceM)} on ${day(ride.day)}`;
  const facts = [
    bikeName,
    surfaceWords[ride.surface].toLowerCase(),
    ride.surface !== 'indoor' && ride.weather !== 'unknown' && weatherWords[ride.weather].toLowerCase(),
    ride.source !== 'typed' && `from ${ride.source.toUpperCase()}`,
  ];
  return (
    <Flex as="li" gap="2" align="center" py="2" borderBottomWidth="1px" _last={{ borderBottomWidth: 0 }}>
      <Box flex="1" minWidth="0">
        <Flex gap="3" align="baseline" wrap="wrap">
          <Text fontWeight="semibold" fontVariantNumeric="tabular-nums">
            {distance(ride.distanceM)}
          </Text>
          <Text>{day(ride.day)}</Text>
        </Flex>
        <Text color="fg.muted" textStyle="sm">
          {facts.filter(Boolean).join(' · ')}
        </Text>
      </Box>
      <IconButton asChild variant="ghost" aria-label={`Edit ${name}`}>
        <Link to={`/rides/${ride.id}`}>
          <Pencil size={18} aria-hidden="true" />
        </Link>
      </IconButton>
      <IconButton variant="ghost" aria-label={`Remove ${name}`} onClick={() => void remove(ride)}>
        <Trash2 size={18} aria-hidden="true" />
      </IconButton>
    </Flex>
  );
}
