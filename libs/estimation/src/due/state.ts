import type { CurrentTreatment } from '../life/treatments';
import type { DueWindow, ElongationState, Factor, RidingForecast } from '../types';
import type { Usage } from '../usage';

/** What the reasons and alerts are read from. */
export interface DueState {
  lubrication: DueWindow | null;
  replacement: DueWindow;
  forecast: RidingForecast;
  /** What a km ahead counts for. */
  perKm: Factor;
  usage: Usage;
  treatment: CurrentTreatment;
  /** Lube km used / median life. */
  shareUsed: number;
  /** Chance that the wear limit is past. */
  chancePast: number;
  doubted: ElongationState['doubted'];
}
