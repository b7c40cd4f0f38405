const stored = (userId: string) => `tidegate.welcomed.${userId}`;

/** True the first time that this person comes in with this browser, and only then. */
export const takeWelcome = (userId: string): boolean => {
  const store = globalThis.localStorage;
  if (!store || store.getItem(stored(userId))) return false;
  store.setItem(stored(userId), new Date().toISOString());
  return true;
};
