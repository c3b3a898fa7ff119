export { defaultRidingModel, HORIZON_DAYS } from './model';
export { forecastRiding } from './forecast';
