import { parentPort, workerData } from 'node:worker_threads';
import { Calendar, Choices, readRides } from './read-rides';

/** What the thread is started with. */
export interface Reading {
  choices: Choices;
  bytes: Uint8Array;
  calendar: Calendar;
}

const { choices, bytes, calendar } = workerData as Reading;
void readRides(choices, bytes, calendar).then((read) => parentPort!.postMessage(read));
