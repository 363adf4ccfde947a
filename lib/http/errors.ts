/** Every way a request can be refused, and the status it is told with (RFC 9110, RFC 6585). */
export const statusOf = {
  'not-signed-in': 401,
  'not-allowed': 403,
  'wrong-origin': 403,
  'not-found': 404,
  'wrong-type': 415,
  'too-large': 413,
  invalid: 422,
  conflict: 409,
  stale: 412,
  'version-missing': 428,
  'too-many': 429,
  unavailable: 503,
  bug: 500,
} as const;

export type ErrorCode = keyof typeof statusOf;

/** One reason for one field; the path is the form's: "queues.2.typedName". */
export type FieldReason = { readonly field: string; readonly reason: string };

/** A field that two people set differently. */
export type ChangedField = { readonly field: string; readonly yours: unknown; readonly theirs: unknown };

export type ErrorDetails = {
  readonly fields?: readonly FieldReason[];
  /** For a stale write: who changed it, when, and in which words. */
  readonly changed?: { readonly by: string; readonly at: string; readonly summary: string } | null;
  readonly differences?: readonly ChangedField[];
  /** The thing as it is now. */
  readonly current?: unknown;
  readonly retryAfterSeconds?: number;
};

/** A refusal with a sentence that says what happened, what it means and what to do. */
export class AppError extends Error {
  override readonly name = 'AppError';
  constructor(readonly code: ErrorCode, message: string, readonly details: ErrorDetails = {}) {
    super(message);
  }
}
