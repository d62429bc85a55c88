/** The four parts of a key as it is shown once, with what each is for. */
export interface KeyPart {
  readonly text: string;
  readonly name: string;
  readonly use: string;
  readonly isSecret: boolean;
}

const checkLength = 7;

/** Parts of `stepwell_<public>_<secret><check>`; together they are the key, character by character. */
export function keyParts(key: string): readonly KeyPart[] {
  const mark = key.indexOf('_') + 1;
  const secret = key.indexOf('_', mark) + 1;
  const check = key.length - checkLength;
  return [
    { text: key.slice(0, mark), name: 'ours', use: 'to find leaks', isSecret: false },
    {
      text: key.slice(mark, secret),
      name: 'public part',
      use: 'in lists and logs',
      isSecret: false,
    },
    { text: key.slice(secret, check), name: 'secret', use: 'for your vault only', isSecret: true },
    { text: key.slice(check), name: 'check', use: 'for typos', isSecret: false },
  ];
}
