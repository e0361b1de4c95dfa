/**
 * Why a calculation has no answer.
 *
 * `unreadable`: something in a cell cannot be understood; `range`: a number lies outside what is possible;
 * `choice`: a word is none of the words offered; `shape`: ranges do not fit each other;
 * `empty`: there is nothing to compute from; `noAnswer`: the question has no answer (infeasible, beyond a measured curve).
 */
export type CalcErrorCode = "unreadable" | "range" | "choice" | "shape" | "empty" | "noAnswer";

/** The one error type of the core: a code for the host, a sentence for the person. The sentence has no trailing stop. */
export class CalcError extends Error {
  constructor(
    readonly code: CalcErrorCode,
    message: string,
  ) {
    super(message);
    this.name = "CalcError";
  }
}
