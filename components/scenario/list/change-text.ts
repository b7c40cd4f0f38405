/** When a scenario was last saved, short enough for a list. */
export const changeText = (iso: string, now: Date): string => {
  const at = new Date(iso);
  if (at.toDateString() === now.toDateString()) return `today ${at.toLocaleTimeString('en-GB', { hour: '2-digit', minute: '2-digit' })}`;
  const year = at.getFullYear() === now.getFullYear() ? {} : ({ year: 'numeric' } as const);
  return at.toLocaleDateString('en-GB', { day: 'numeric', month: 'short', ...year });
};
