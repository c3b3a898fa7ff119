import type { CurrentTreatment } from '../life/treatments';
import type { DueWindow, Factor, RidingForecast } from '../types';
import type { Usage } from '../usage';

/** What the reasons and alerts are read from. */
export interface DueState {
  lubrication: DueWindow | null;
  replacement: DueWindow;
  forecast: RidingForecast;
  perKm: Factor;
  usage: Usage;
  treatment: CurrentTreatment;
}
