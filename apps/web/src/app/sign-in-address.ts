/** The sign-in, which afterwards leads back to the given page. */
export const signInAddress = (pathname: string, search: string): string =>
  pathname === '/' ? '/sign-in' : `/sign-in?to=${encodeURIComponent(pathname + search)}`;
