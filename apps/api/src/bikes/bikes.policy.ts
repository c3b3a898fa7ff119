import type { Actor } from '../common/actor';
import { mayReachRider } from '../riders/riders.policy';

/** Who reaches a rider reaches that rider's bikes. */
export const mayReachBike = (actor: Pick<Actor, 'role' | 'riderId'>, bike: { riderId: string }): boolean =>
  mayReachRider(actor, bike.riderId);
