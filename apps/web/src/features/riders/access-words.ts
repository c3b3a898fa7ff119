import type { Rider } from '@halfpitch/contracts';

/** Whether the rider can sign in. */
export const accessWords: Record<Rider['access'], string> = {
  none: 'Not invited',
  invited: 'Invited',
  joined: 'Joined',
};
