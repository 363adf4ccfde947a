import { statusOf, type AppError, type ErrorCode, type ErrorDetails } from './errors';

/** Problem details as in RFC 9457, with our code and what a form needs. */
export type Problem = ErrorDetails & {
  readonly type: 'about:blank';
  readonly title: string;
  readonly status: number;
  readonly detail: string;
  readonly code: ErrorCode;
};

const titles: Readonly<Record<ErrorCode, string>> = {
  'not-signed-in': 'Not signed in',
  'not-allowed': 'Not allowed',
  'wrong-origin': 'Wrong origin',
  'not-found': 'Not found',
  'wrong-type': 'Wrong type of content',
  'too-large': 'Too large',
  invalid: 'Some fields need a look',
  conflict: 'In the way of something else',
  stale: 'Changed by somebody else',
  'version-missing': 'Version missing',
  'too-many': 'Too many tries',
  unavailable: 'Not available now',
  bug: 'Something broke',
};

export const problemOf = (error: AppError): Problem => ({
  type: 'about:blank', title: titles[error.code], status: statusOf[error.code], detail: error.message, code: error.code, ...error.details,
});

export const problemResponse = (error: AppError): Response => {
  const problem = problemOf(error);
  const headers = new Headers({ 'Content-Type': 'application/problem+json; charset=utf-8', 'Cache-Control': 'no-store' });
  if (error.details.retryAfterSeconds !== undefined) headers.set('Retry-After', String(error.details.retryAfterSeconds));
  return new Response(JSON.stringify(problem), { status: problem.status, headers });
};
