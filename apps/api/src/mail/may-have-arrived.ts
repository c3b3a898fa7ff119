interface SmtpError {
  code?: string;
  /** What the server answered, where it did. */
  responseCode?: number;
  /** The operating system's call that failed, where one did. */
  syscall?: string;
  /** Which patience ran out, where one did. */
  timeoutType?: string;
}

/** Failures that end the dialogue before the letter is handed over. */
const BEFORE = new Set(['EDNS', 'ETLS', 'EAUTH', 'EENVELOPE', 'EMESSAGE']);

/**
 * Whether the server may hold the letter although sending it failed. It cannot when it said no, or when the
 * connection did not come about; one that broke later may have broken after the letter was taken.
 */
export function mayHaveArrived(error: unknown): boolean {
  const { code = '', responseCode, syscall, timeoutType = '' } = error as SmtpError;
  if (responseCode !== undefined || BEFORE.has(code)) return false;
  if (syscall === 'connect' || syscall === 'getaddrinfo') return false;
  return !['CONNECT_TIMEOUT', 'GREETING_TIMEOUT', 'UPGRADE_TIMEOUT'].includes(timeoutType);
}
