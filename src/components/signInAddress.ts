/** Where a stranger is sent, and comes back from: `/sign-in?returnTo=%2Fswatches%2Fnew`. */
export function signInAddress({ pathname, search }: URL): string {
  return `/sign-in?returnTo=${encodeURIComponent(pathname + search)}`;
}
