/** Characters that JSON may hold as they are, but that no line of code should. */
const unseen = /[\u007f-\u009f\u200b-\u200f\u2028-\u202e\u2060-\u2069\ufeff]/g;

const escaped = (character: string) =>
  `\\u${character.charCodeAt(0).toString(16).padStart(4, '0')}`;

const scalar = (value: unknown) => JSON.stringify(value).replace(unseen, escaped);

function inline(value: unknown): string {
  if (Array.isArray(value)) return `[${value.map(inline).join(', ')}]`;
  if (typeof value !== 'object' || value === null) return scalar(value);
  return `{ ${Object.entries(value).map(pair).join(', ')} }`;
}

const isObject = (value: unknown) => typeof value === 'object' && value !== null;

/** A list of objects has a line for each; anything else stands in one. */
function member(value: unknown, indent: string): string {
  const isList = Array.isArray(value) && value.length > 1 && value.every(isObject);
  if (!isList) return inline(value);
  const lines = value.map((one) => `${indent}    ${inline(one)}`);
  return `[\n${lines.join(',\n')}\n${indent}  ]`;
}

const pair = ([key, value]: [string, unknown]) => `${scalar(key)}: ${inline(value)}`;

/**
 * An object as JSON to be read: one member a line, lists of objects one object a line, further lines
 * after `indent`. Strings hold no raw control character, so that the text is at once valid JSON,
 * Python and TypeScript.
 */
export function jsonText(value: object, indent = ''): string {
  const members = Object.entries(value)
    .filter(([, written]) => written !== undefined)
    .map(([key, written]) => `${indent}  ${scalar(key)}: ${member(written, indent)}`);
  return `{\n${members.join(',\n')}\n${indent}}`;
}
