/** Time that a test of the engine may take where other work holds the processor: many times what it needs alone. */
export const SLOW = { timeout: 1_200_000 } as const;
