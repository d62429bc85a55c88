import type { z } from 'zod';
import { decimalFaults } from '../../shared/decimal';
import type { Fault } from '../../shared/problem';
import { jsonPointer } from './json-pointer';

type Issue = z.core.$ZodIssue;
type Path = readonly PropertyKey[];

const ownCode = (issue: Issue): string | undefined => {
  const code: unknown = issue.code === 'custom' ? issue.params?.code : undefined;
  return typeof code === 'string' ? code : undefined;
};

const isMissing = ({ code, input }: Issue) =>
  input === undefined && (code === 'invalid_type' || code === 'invalid_union');

const codeOf = (issue: Issue): string => {
  if (issue.code === 'too_big' || issue.code === 'too_small') return 'out-of-range';
  return (
    decimalFaults.get(issue.message) ??
    ownCode(issue) ??
    (issue.code === 'invalid_type' ? 'wrong-type' : 'invalid-value')
  );
};

/** Fields that a branch lacks or does not know: how far a value is from its shape. */
const strangers = (issues: readonly Issue[]) =>
  issues.reduce(
    (sum, issue) =>
      sum + (issue.code === 'unrecognized_keys' ? issue.keys.length : isMissing(issue) ? 1 : 0),
    0,
  );

/** A number where one of the branches is a decimal: it is that decimal, whatever else it may be. */
const isNumberForDecimal = ([first]: readonly Issue[]) =>
  first !== undefined && first.path.length === 0 && codeOf(first) === 'decimal-must-be-string';

/**
 * The branch of a union that the caller meant: of those that got past the outermost type, the one
 * with the fewest fields missing or unknown.
 */
function meantBranch(branches: readonly (readonly Issue[])[]) {
  const [meant] = branches.filter(isNumberForDecimal);
  if (meant) return meant;
  const [nearest] = branches
    .filter(([first]) => first && !(first.code === 'invalid_type' && first.path.length === 0))
    .sort((one, other) => strangers(one) - strangers(other));
  return nearest;
}

function faultsOfIssue(issue: Issue, parents: Path): Fault[] {
  const path = [...parents, ...issue.path];
  if (isMissing(issue)) {
    return [{ pointer: jsonPointer(path), code: 'missing', detail: 'This field is needed.' }];
  }
  if (issue.code === 'invalid_union') {
    const branch = meantBranch(issue.errors);
    if (branch) return branch.flatMap((inner) => faultsOfIssue(inner, path));
  }
  if (issue.code === 'unrecognized_keys') {
    return issue.keys.map((key) => ({
      pointer: jsonPointer([...path, key]),
      code: 'unknown-field',
      detail: 'This operation does not take this field.',
    }));
  }
  return [{ pointer: jsonPointer(path), code: codeOf(issue), detail: issue.message }];
}

/** A body can be wrong in thousands of places; this many are told. */
export const faultsAtMost = 50;

/**
 * What is wrong with a request, field by field, with RFC 6901 pointers; at most 50 faults. The error
 * must have been made with `reportInput`.
 */
export const faultsOf = (error: z.ZodError): Fault[] =>
  error.issues.flatMap((issue) => faultsOfIssue(issue, [])).slice(0, faultsAtMost);

/** The same for query parameters: `?name` in place of a pointer. */
export const queryFaultsOf = (error: z.ZodError): Fault[] =>
  faultsOf(error).map((fault) => ({ ...fault, pointer: fault.pointer.replace('/', '?') }));
