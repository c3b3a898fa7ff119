export { defaultRidingModel } from './default-model';
export { fitRidingInSteps, fitRidingModel } from './fit';
export { forecastRiding } from './forecast';
export type { RiderLog } from './lessons';
export { HORIZON_DAYS } from './model';
