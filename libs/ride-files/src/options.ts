/** What a caller may set; all have defaults that suit one server or one browser tab. */
export interface ReadOptions {
  /** IANA zone for files that tell UTC only, usually the workshop's. Default: the day in UTC. */
  timeZone?: string;
  /** How the columns of a CSV were matched, once asked. */
  matching?: import('./csv/matching').CsvMatching;
  limits?: Partial<Limits>;
}

/** Sizes in bytes. */
export interface Limits {
  xmlBytes: number;
  fitBytes: number;
  csvBytes: number;
  archiveBytes: number;
  archiveEntries: number;
  /** All entries together, unpacked. */
  unpackedBytes: number;
  /** Unpacked to packed size beyond which a large entry is taken for a bomb. */
  archiveRatio: number;
}

const MB = 1024 * 1024;
export const defaultLimits: Limits = {
  xmlBytes: 192 * MB,
  fitBytes: 48 * MB,
  csvBytes: 32 * MB,
  archiveBytes: 100 * MB,
  archiveEntries: 2000,
  unpackedBytes: 512 * MB,
  archiveRatio: 200,
};

export const limitsOf = (options: ReadOptions): Limits => ({ ...defaultLimits, ...options.limits });
