import { basesOf, provenanceWords, stepsInWords } from '../../../components/handbook/bases';
import { suggestions } from '../../../components/handbook/suggestions';
import { systemTitle } from '../../../components/handbook/system-title';
import { countInWords } from '../../../components/systems/count-in-words';
import { oneLineCall } from '../../../components/systems/one-line-call';
import { handbook } from '../../../server/database/handbook/handbook';

const preferred = (id: string) => {
  const found = handbook().find((entry) => entry.id === id);
  return found?.determinations[0]?.constants ?? [];
};

describe('what constants stand on', () => {
  test('one source and one medium is said once', () => {
    const bases = basesOf(preferred('phosphoric-acid'));
    expect(bases).toHaveLength(1);
    expect(bases[0]).toMatchObject({ steps: [1, 2, 3], provenance: 'recalled' });
    expect(bases[0]?.media.map(({ steps, kind }) => ({ steps, kind }))).toEqual([
      { steps: [1, 2, 3], kind: 'thermodynamic' },
    ]);
  });

  test('EDTA holds in two media, from one source', () => {
    const [basis, ...others] = basesOf(preferred('edta'));
    expect(others).toEqual([]);
    expect(basis?.media.map(({ steps, ionicStrength }) => ({ steps, ionicStrength }))).toEqual([
      { steps: [1, 2, 3, 4], ionicStrength: '1' },
      { steps: [5, 6], ionicStrength: '0.1' },
    ]);
  });

  test('a value that was read stands apart from recalled ones of the same source', () => {
    const crc = handbook().find(({ id }) => id === 'phosphoric-acid')?.determinations[1];
    expect(
      basesOf(crc?.constants ?? []).map(({ steps, provenance }) => [steps, provenance]),
    ).toEqual([
      [[1], 'read'],
      [[2, 3], 'recalled'],
    ]);
  });

  test('every constant of the handbook stands on exactly one basis and in one medium', () => {
    for (const { id, determinations } of handbook()) {
      for (const { constants } of determinations) {
        const bases = basesOf(constants);
        const all = constants.map(({ step }) => step);
        const sorted = (steps: readonly number[]) => [...steps].sort((a, b) => a - b);
        expect([id, sorted(bases.flatMap(({ steps }) => steps))]).toEqual([id, all]);
        const ofMedia = bases.flatMap(({ media }) => media.flatMap(({ steps }) => steps));
        expect([id, sorted(ofMedia)]).toEqual([id, all]);
      }
    }
  });

  test.each([
    [[1], '1'],
    [[1, 2], '1 and 2'],
    [[1, 2, 3, 4], '1 to 4'],
    [[1, 3, 5, 6, 7], '1, 3 and 5 to 7'],
  ])('%j in words is %s', (steps, words) => expect(stepsInWords(steps)).toBe(words));

  test('provenance is said as it is', () => {
    const words = (provenance: 'read' | 'recalled' | 'stated', provenanceNote: string | null) =>
      provenanceWords({ provenance, provenanceNote });
    expect(words('read', 'a public copy')).toBe('Read in a public copy');
    expect(words('read', null)).toBe('Read in a copy of the source');
    expect(words('recalled', 'within 0.05')).toBe('Recalled: within 0.05');
    expect(words('recalled', null)).toBe('Recalled');
    expect(words('stated', null)).toBe('Stated by its owner');
  });
});

test.each([
  ['phosphoric acid', 'Phosphoric acid'],
  ['tris', 'Tris'],
  ['EDTA', 'EDTA'],
  ['2-naphthol', '2-naphthol'],
  ['o-cresol', 'o-cresol'],
])('%s as a title is %s', (name, title) => expect(systemTitle(name)).toBe(title));

test('each suggestion is a system of the handbook under the name it is shown by', () => {
  const names = new Map(handbook().map(({ id, name }) => [id, name]));
  for (const { id, name } of suggestions) expect([id, names.get(id)]).toEqual([id, name]);
});

test.each([
  [50, true, '', 'The first 50 systems are shown.'],
  [249, false, '', 'All 249 systems are shown.'],
  [50, true, 'acid', 'The first 50 systems are shown.'],
  [2, false, 'citric', '2 systems match citric.'],
  [1, false, '77-92-9', '1 system matches 77-92-9.'],
  [0, false, 'xyz', 'No system matches xyz.'],
])('%i shown, more %s, for %j: %s', (shown, more, query, words) => {
  expect(countInWords(shown, more, query)).toBe(words);
});

test('the call by id is one for a shell, its key in a variable', () => {
  expect(oneLineCall('http://127.0.0.1:8080', 'tris')).toBe(
    'curl "http://127.0.0.1:8080/v1/systems/tris/fractions?pH=7.4" \\\n' +
      '  -H "Authorization: Bearer $STEPWELL_KEY"',
  );
});
