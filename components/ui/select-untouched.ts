/**
 * Selects what stands in a field that was just entered, so that typing replaces it. Browsers want this a moment
 * after the focus; a key pressed in that moment is kept, which `selectTextOnFocus` would select and lose.
 */
export const selectUntouched = (event?: { target: unknown }): void => {
  const input = event?.target;
  if (typeof HTMLInputElement === 'undefined' || !(input instanceof HTMLInputElement)) return;
  const found = input.value;
  setTimeout(() => {
    if (document.activeElement === input && input.value === found) input.select();
  }, 0);
};
