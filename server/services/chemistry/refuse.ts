import { Refusal } from '../../refusal';

/** A question that is well put, and has no honest answer: with the reason in the trade’s words. */
export const noAnswer = (code: string, pointer: string, detail: string): Refusal =>
  new Refusal('no-answer', detail, [{ pointer, code, detail }]);

/** A request whose parts do not fit each other. */
export const misfit = (code: string, pointer: string, detail: string): Refusal =>
  new Refusal('invalid-request', detail, [{ pointer, code, detail }]);
