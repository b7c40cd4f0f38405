const stored = (userId: string) => `tidegate.welcomed.${userId}`;

/** Whether this person has been here with this browser before. */
export const wasWelcomed = (userId: string): boolean => Boolean(globalThis.localStorage?.getItem(stored(userId)));

export const markWelcomed = (userId: string): void => globalThis.localStorage?.setItem(stored(userId), new Date().toISOString());
