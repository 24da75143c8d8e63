/** Queues of this feature. */
export const queues = { spread: 'notices-spread', letters: 'notices-letters' } as const;
