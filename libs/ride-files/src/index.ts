export * from './types';
export * from './csv/matching';
export { inspectCsv, readCsv } from './csv/read-csv';
export { rideFingerprint, rideLikeness, fingerprintAll } from './fingerprint';
export { UnreadableFile } from './unreadable';
