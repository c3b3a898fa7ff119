export * from './types';
export * from './csv/matching';
export * from './options';
export { readRideFile, readWholeRideFile } from './read-ride-file';
export { summariseFile, type FileSummary } from './summary';
export { inspectCsv, readCsv } from './csv/read-csv';
export { rideFingerprint, fingerprintAll } from './fingerprint';
export { sameRide } from './same-ride';
export { UnreadableFile } from './unreadable';
