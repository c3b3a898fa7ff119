import type { CurrentTreatment } from '../life/treatments';
import type { Day, DueWindow, ElongationState, Factor, RidingForecast } from '../types';
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
  /** How the chain arrived last, where that is more likely mistaken than true. */
  doubtfulArrival: { day: Day; lubeKm: number } | null;
}
