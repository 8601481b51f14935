// Light: no imports.

/** Outcomes a caller can act on. The status of each is stated once, here. */
export const errorStatus = {
  'bad-input': 422,
  'malformed': 400,
  'sign-in-needed': 401,
  'wrong-sign-in': 422,
  'not-allowed': 403,
  'suspended': 403,
  'not-found': 404,
  'newer-exists': 409,
  'already-taken': 409,
  'in-use': 409,
  'falls-short': 409,
  'too-large': 413,
  'wrong-type': 415,
  'too-many': 429,
  'cross-site': 403,
  'broken': 500,
  'not-ready': 503,
  'unreachable': 503,
} as const;
export type ErrorCode = keyof typeof errorStatus;

/** Words for beside each field, keyed by the path of the field: `title`, `stages.2.title`, `<block>.<line>.amount`. */
export type FieldProblems = Readonly<Record<string, string>>;

/** RFC 9457 problem details, the one shape of an error on the wire. */
export interface ProblemDetails {
  type: string;
  title: string;
  status: number;
  detail: string;
  code: ErrorCode;
  fields?: FieldProblems;
  requestId?: string;
  /** With `newer-exists`: what stands there now. */
  newer?: unknown;
}

const brand = Symbol.for('tallywright.AppError');

/** An outcome the caller can act on; everything else thrown is a bug. */
export class AppError extends Error {
  /** The server and the pages it renders are bundled apart, each with this class: an outcome is known by its brand in both. */
  static override [Symbol.hasInstance](value: unknown): boolean {
    return typeof value === 'object' && value !== null && brand in value;
  }
  readonly [brand] = true;
  readonly code: ErrorCode;
  readonly fields: FieldProblems | undefined;
  readonly newer: unknown;
  constructor(code: ErrorCode, message: string, fields?: FieldProblems, newer?: unknown) {
    super(message);
    this.name = 'AppError';
    this.code = code;
    this.fields = fields;
    this.newer = newer;
  }
  get status(): number {
    return errorStatus[this.code];
  }
}
