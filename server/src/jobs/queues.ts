/** Every queue with what may wait in it. Queues are made by the migrate command. */
export interface JobPayloads {
  'send-mail': { messageId: string };
  'close-sitting': { sittingId: string };
  'mark-sitting': { sittingId: string };
  'draw-certificate': { certificateId: string };
}

export type QueueName = keyof JobPayloads;

export const QUEUES: readonly QueueName[] = [
  'send-mail',
  'close-sitting',
  'mark-sitting',
  'draw-certificate',
];
