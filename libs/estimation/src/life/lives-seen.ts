import { checkHistory } from '../check-history';
import type { ChainHistory, Factors } from '../types';
import { chainUsage } from '../usage';
import { LifeObservation, tells } from './rider-life';
import { lifeObservations } from './treatments';

/** What one chain's arrivals tell of the lives of treatments. @throws ImpossibleInputError */
export function livesSeen(history: ChainHistory, factors: Factors): LifeObservation[] {
  checkHistory(history);
  return lifeObservations(history, chainUsage(history, factors)).filter(tells);
}
