/** The token of an `Authorization: Bearer` header (RFC 6750), or undefined where there is no such header. */
export function bearerOf(authorization: string | undefined): string | undefined {
  return /^Bearer +(\S+) *$/i.exec(authorization ?? '')?.[1];
}
