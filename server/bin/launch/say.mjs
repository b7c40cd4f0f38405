/** What went wrong in plain words, with what to do; ends the command without a stack. */
export class Halt extends Error {}

/** One short line: what is at work, and what it does. */
export const say = (topic, text) => process.stdout.write(`${topic.padEnd(10)} ${text}\n`);

export const seconds = (since) => `${((Date.now() - since) / 1000).toFixed(1)} s`;
