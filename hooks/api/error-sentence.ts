import type { ErrorCode } from '@/shared/error-codes';

import { ApiError, OfflineError } from './api-error';

const SENTENCES: Record<ErrorCode, string> = {
  'invalid-input': 'A field holds a value that cannot be used. Correct the marked field',
  'malformed-body': 'The server could not read what was sent. Reload the page and try again',
  'not-signed-in': 'You are signed out. Sign in again; what you typed is kept',
  'wrong-credentials': 'E-mail address and password do not belong together. Check both and try again',
  'not-allowed': 'Your role does not allow this. Ask a designer of the team or an admin',
  'cross-site': 'The request did not come from this page. Open Tidegate in its own tab and try again',
  'not-found': 'Nothing is here, or it belongs to another team. Go back to the list',
  'version-conflict': 'Someone else changed this meanwhile. Compare the two and choose',
  'body-too-large': 'That is too much to send at once. Shorten it and try again',
  'unsupported-media': 'The server does not take this kind of content. Reload the page and try again',
  'too-many-attempts': 'Too many attempts. Wait a few minutes, then try again',
  internal: 'Something went wrong in the server. Try again; if it stays, quote the number',
  busy: 'The server is computing at its limit. Try again in a moment',
  'database-unavailable': 'The server cannot reach its records just now. What you typed is kept; try again in a moment',
};

/** What went wrong and what to do, in plain words. */
export const errorSentence = (error: unknown): string => {
  if (error instanceof OfflineError) return 'No answer from the server. Check the connection and try again.';
  if (!(error instanceof ApiError)) return 'Something went wrong on this page. Reload it; what you typed is kept.';
  const number = error.code === 'internal' && error.details.instance ? ` (${error.details.instance})` : '';
  return `${SENTENCES[error.code]}${number}.`;
};
