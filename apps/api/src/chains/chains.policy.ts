import type { Actor } from '../common/actor';
import { mayReachRider } from '../riders/riders.policy';

/** Who reaches a rider reaches that rider's chains. */
export const mayReachChain = (actor: Pick<Actor, 'role' | 'riderId'>, chain: { riderId: string }): boolean =>
  mayReachRider(actor, chain.riderId);

/** A chain goes onto its own rider's bikes only. */
export const mayFit = (chain: { riderId: string }, bike: { riderId: string }): boolean =>
  chain.riderId === bike.riderId;

/** A rider cannot remove a chain, and with it the record of what the workshop did to it. */
export const mayRemoveChain = (actor: Pick<Actor, 'role'>, treated: boolean): boolean =>
  actor.role !== 'rider' || !treated;
