import { moment, oneLine, quoted, type Letter } from '../mail/letter';

/** What was done to a key, by whom, when and from where. */
export interface KeyAct {
  readonly organization: string;
  readonly person: { readonly name: string; readonly email: string };
  readonly key: {
    readonly publicId: string;
    readonly name: string;
    readonly scopes: readonly string[];
    readonly expiresAt: Date;
  };
  readonly at: Date;
  /** Network address, where it is known. */
  readonly address?: string | undefined;
  /** Page of the organization's keys. */
  readonly keysUrl: string;
}

const nameOf = ({ publicId }: KeyAct['key']) => `stepwell_${publicId}…`;

function letter(
  act: KeyAct,
  did: string,
  rows: readonly [string, string][],
  advice: string,
): Letter {
  const { organization, person, key, at, address } = act;
  const table = [
    ['Key', `${nameOf(key)}, named ${quoted(key.name)}`],
    ...rows,
    ['When', moment(at)],
    ...(address ? [['From', oneLine(address)]] : []),
  ];
  return {
    subject: `API key ${nameOf(key)} ${did} for ${quoted(organization)}`,
    text: [
      `${quoted(person.name)} (${oneLine(person.email)}) ${did} an API key of ${quoted(organization)}.`,
      '',
      ...table.map(([what = '', value]) => `  ${what.padEnd(9)}${value}`),
      '',
      advice,
      '',
      `You get this as an admin of ${quoted(organization)}.`,
      '',
    ].join('\n'),
  };
}

/** Tells admins of a key issued. The key is named by its public part alone. */
export const keyIssuedLetter = (act: KeyAct): Letter =>
  letter(
    act,
    'issued',
    [
      ['May', act.key.scopes.map(oneLine).join(', ')],
      ['Expires', moment(act.key.expiresAt)],
    ],
    `If nobody should have, revoke it: ${act.keysUrl}`,
  );

/** Tells admins of a key revoked. */
export const keyRevokedLetter = (act: KeyAct): Letter =>
  letter(
    act,
    'revoked',
    [],
    `What called with it is refused from now on. The organization’s keys: ${act.keysUrl}`,
  );
