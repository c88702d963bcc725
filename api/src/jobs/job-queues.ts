/** Every queue, its tries and how long one try may take before the job is handed to another worker. */
export const JOB_QUEUES = [
  { name: 'make-export', retryLimit: 2, retryDelay: 5, retryBackoff: true, expireInSeconds: 180 },
] as const;

export type JobQueue = (typeof JOB_QUEUES)[number]['name'];
