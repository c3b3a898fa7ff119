import { checkHistory } from './check-history';
import type { PlacedReading } from './elongation/model';
import { LifeObservation, tells } from './life/rider-life';
import { lifeObservations } from './life/treatments';
import { placedReadings } from './placed';
import type { BikeKind, ChainHistory, Factors, Regime } from './types';
import { chainUsage } from './usage';

/** What one chain teaches a workshop: how it was found on arrival, and what was measured at which wear. */
export interface ChainLesson {
  regime: Regime;
  bikeKind: BikeKind;
  lives: LifeObservation[];
  readings: PlacedReading[];
}

/** Takes the lesson of one chain. @throws ImpossibleInputError */
export function chainLesson(history: ChainHistory, factors: Factors): ChainLesson {
  checkHistory(history);
  const usage = chainUsage(history, factors);
  return {
    regime: history.regime,
    bikeKind: history.bikeKind,
    lives: lifeObservations(history, usage).filter(tells),
    readings: placedReadings(history, usage),
  };
}
