/** What somebody asked for at an address that may or may not have an account. */
export type AddressAsk = 'sign-up' | 'confirm-again' | 'reset-password';

/** Every queue with what may wait in it. Queues are made by the migrate command. */
export interface JobPayloads {
  'answer-address': { requestId: string; ask: AddressAsk; email: string };
  'send-mail': { messageId: string };
  'close-sitting': { sittingId: string };
  'mark-sitting': { sittingId: string };
  'draw-certificate': { certificateId: string };
  'remark-attempts': Record<string, never>;
}

export type QueueName = keyof JobPayloads;

export const QUEUES: readonly QueueName[] = [
  'answer-address',
  'send-mail',
  'close-sitting',
  'mark-sitting',
  'draw-certificate',
  'remark-attempts',
];

/** What is enqueued by itself, by the clock of UTC. */
export const SCHEDULES: readonly { queue: QueueName; cron: string; hoursAtMost: number }[] = [
  { queue: 'remark-attempts', cron: '40 2 * * *', hoursAtMost: 6 },
];
