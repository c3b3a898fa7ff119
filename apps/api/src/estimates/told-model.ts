import { isDeepStrictEqual } from 'node:util';
import type { EstimationModel, Regime } from '@halfpitch/contracts';
import { defaultFleetModel, defaultRidingModel } from '@halfpitch/estimation';
import type { FleetModel } from '@halfpitch/estimation';
import { learnedOn } from './refit';

/** The 90 % point of the standard normal: eight of ten lie within so many standard errors. */
const EIGHT_OF_TEN = 1.2816;

/** What a workshop has learned, beside what it started from. */
export function toldModel(fleet: FleetModel): EstimationModel {
  const start = defaultFleetModel();
  const riding = fleet.riding as { riders?: number };
  const isOwn = !isDeepStrictEqual(fleet.riding, defaultRidingModel);
  const lifeKinds = Object.keys(start.life.kinds) as (keyof FleetModel['life']['kinds'])[];
  return {
    learnedOn: learnedOn(fleet),
    lives: lifeKinds.map((kind) => {
      const { median, observations, logSe } = fleet.life.kinds[kind];
      const at = (side: number) =>
        logSe === undefined ? null : median * Math.exp(side * EIGHT_OF_TEN * logSe);
      return {
        kind,
        start: start.life.kinds[kind].median,
        median,
        observations,
        low: at(-1),
        high: at(1),
      };
    }),
    rates: (Object.keys(start.elongation.rate) as Regime[]).flatMap((regime) =>
      Object.entries(fleet.elongation.rate[regime])
        .filter(([, { chains }]) => chains > 0)
        .map(([kind, { median, chains }]) => {
          const bikeKind = kind as keyof FleetModel['elongation']['rate'][Regime];
          return { regime, bikeKind, start: start.elongation.rate[regime][bikeKind].median, median, chains };
        }),
    ),
    riding: { ownRiders: isOwn ? (riding.riders ?? 0) : 0, shippedRiders: defaultRidingModel.riders },
  };
}
