import fc from 'fast-check';
import {
  keyIssuedLetter,
  keyRevokedLetter,
  type KeyAct,
} from '../../../server/services/keys/key-letters';

const act: KeyAct = {
  organization: 'Larkmoor Assay',
  person: { name: 'Demo developer', email: 'developer@larkmoor.example' },
  key: {
    publicId: 'axdkhovjww3s',
    name: 'lims-nightly',
    scopes: ['compute', 'systems:read'],
    expiresAt: new Date('2027-03-01T13:05:00Z'),
  },
  at: new Date('2026-12-01T13:05:59Z'),
  address: '198.51.100.1',
  keysUrl: 'https://stepwell.example/keys',
};

test('a key issued is told with who, which, what for, until when and from where', () => {
  expect(keyIssuedLetter(act)).toEqual({
    subject: 'API key stepwell_axdkhovjww3s… issued for "Larkmoor Assay"',
    text: `"Demo developer" (developer@larkmoor.example) issued an API key of "Larkmoor Assay".

  Key      stepwell_axdkhovjww3s…, named "lims-nightly"
  May      compute, systems:read
  Expires  2027-03-01 13:05 UTC
  When     2026-12-01 13:05 UTC
  From     198.51.100.1

If nobody should have, revoke it: https://stepwell.example/keys

You get this as an admin of "Larkmoor Assay".
`,
  });
});

test('a key revoked is told with who and which', () => {
  expect(keyRevokedLetter({ ...act, address: undefined })).toEqual({
    subject: 'API key stepwell_axdkhovjww3s… revoked for "Larkmoor Assay"',
    text: `"Demo developer" (developer@larkmoor.example) revoked an API key of "Larkmoor Assay".

  Key      stepwell_axdkhovjww3s…, named "lims-nightly"
  When     2026-12-01 13:05 UTC

What called with it is refused from now on. The organization’s keys: https://stepwell.example/keys

You get this as an admin of "Larkmoor Assay".
`,
  });
});

test('whatever people are called, a letter has its own lines and one line of subject', () => {
  const hostile = fc.oneof(
    fc.string({ unit: 'binary' }),
    fc.constantFrom(
      'x\r\nBcc: all@evil.example',
      'a\u2028b',
      '\u202Eesrever',
      'x" was kind. "y',
      '\n\n.\n',
    ),
  );
  const usual = keyIssuedLetter(act).text.split('\n').length;
  fc.assert(
    fc.property(hostile, hostile, hostile, hostile, (organization, person, email, name) => {
      const { subject, text } = keyIssuedLetter({
        ...act,
        organization,
        person: { name: person, email },
        key: { ...act.key, name },
      });
      expect(subject).not.toMatch(/[\p{Cc}\u2028\u2029\p{Bidi_Control}]/u);
      expect(text.split(/[\n\r\u2028\u2029\u0085]/u)).toHaveLength(usual);
      // Two around each name: nobody closes them from within.
      expect(text.match(/"/g)?.length).toBe(8 + (email.match(/"/g)?.length ?? 0));
    }),
    { numRuns: 500 },
  );
});
