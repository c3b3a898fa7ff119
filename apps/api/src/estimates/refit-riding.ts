import { defaultRidingModel, fitRidingInSteps } from '@halfpitch/estimation';
import type { RiderLog } from '@halfpitch/estimation';
import { setImmediate } from 'node:timers/promises';

/** With fewer logs the shipped model, learned from sixteen riders, is the better teacher. */
export const LEAST_LOGS = 10;

/**
 * How riding goes on, learned from the workshop's own riders, drawn to the shipped model the more the fewer they are.
 * Takes seconds; lets requests through in between.
 */
export async function refitRiding(logs: readonly RiderLog[]) {
  if (logs.length < LEAST_LOGS) return defaultRidingModel;
  const steps = fitRidingInSteps(logs);
  let step = steps.next();
  while (!step.done) {
    await setImmediate();
    step = steps.next();
  }
  return step.value;
}
