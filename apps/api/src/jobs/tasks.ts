/** Every named task of the queue and what it is given. Ids only: what matters is read when the task runs. */
export interface Tasks {
  'estimate-chain': { workshopId: string; chainId: string };
  /** With `since`, an instant, estimates made before it don't count: what they were made from has changed. */
  'estimate-workshop': { workshopId: string; since?: string };
  'refit-workshop': { workshopId: string };
  'import-rides': { workshopId: string; importId: string };
  'send-mail': { mailId: string; workshopId?: string; accountId?: string };
}
export type TaskName = keyof Tasks;

/** How each queue treats its tasks. 'short': of one key, one waits at most. */
export const QUEUES = {
  'estimate-chain': { policy: 'short', retryLimit: 5, retryDelay: 5, retryBackoff: true },
  'estimate-workshop': {
    policy: 'short',
    retryLimit: 5,
    retryDelay: 60,
    retryBackoff: true,
    expireInSeconds: 3600,
  },
  'refit-workshop': {
    policy: 'short',
    retryLimit: 2,
    retryDelay: 600,
    retryBackoff: true,
    expireInSeconds: 3600,
  },
  'import-rides': {
    policy: 'standard',
    retryLimit: 2,
    retryDelay: 5,
    retryBackoff: true,
    expireInSeconds: 300,
  },
  'send-mail': { policy: 'standard', retryLimit: 12, retryDelay: 30, retryBackoff: true },
} as const;
export const taskNames = Object.keys(QUEUES) as TaskName[];
