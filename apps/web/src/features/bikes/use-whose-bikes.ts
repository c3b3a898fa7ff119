import { useQuery } from '@tanstack/react-query';
import { useSearchParams } from 'react-router-dom';
import { useSession } from '../../app/session';
import { bikeQuery } from './api/bike';
import { bikesQuery } from './api/bikes';

/**
 * The bikes a page is about: a rider's own; for staff those of the rider named in the address, `?rider=`, or of the
 * rider whose bike is, `?bike=`.
 */
export function useWhoseBikes() {
  const session = useSession();
  const [search] = useSearchParams();
  const [rider, bikeId] = [session.riderId ?? search.get('rider'), search.get('bike')];
  const named = useQuery({ ...bikeQuery(bikeId ?? ''), enabled: rider === null && bikeId !== null });
  const riderId = rider ?? named.data?.riderId;
  const bikes = useQuery({ ...bikesQuery({ riderId }), enabled: riderId !== undefined });
  return { bikeId, riderId, bikes, isNamed: rider !== null || bikeId !== null };
}
