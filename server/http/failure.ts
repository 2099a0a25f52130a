/** The one error of the server: what went wrong as the caller is told it. */
import type { ErrorBody, ErrorCode } from '../../model/contracts/common';

const STATUS: Readonly<Record<ErrorCode, number>> = {
  badInput: 400,
  signedOut: 401,
  notAllowed: 403,
  notFound: 404,
  stale: 409,
  alreadyThere: 409,
  expired: 410,
  tooLarge: 413,
  tooMany: 429,
  broken: 500,
  unavailable: 503,
};

export class Failure extends Error {
  override readonly name = 'Failure';
  readonly code: ErrorCode;
  readonly field: string | undefined;
  readonly status: number;

  /** `message` is shown to people; `field` is the path of the input that was wrong, `drawing.runs.3.to`. */
  constructor(code: ErrorCode, message: string, options: { readonly field?: string; readonly status?: number } = {}) {
    super(message);
    this.code = code;
    this.field = options.field;
    this.status = options.status ?? STATUS[code];
  }

  toBody(): ErrorBody {
    const { code, message, field } = this;
    return { error: { code, message, ...(field === undefined ? {} : { field }) } };
  }
}
