import { checkDraft, draftOf } from '../../../components/constants/constants-draft';
import { pastedConstants } from '../../../components/constants/pasted-constants';

const draft = { name: 'Larkmoor buffer', charge: '0', pKa: ['2.148', '7.198', '12.35'] };

describe('a system that is typed', () => {
  test('constants are taken as written', () => {
    expect(checkDraft(draft)).toEqual({
      ok: true,
      system: { name: 'Larkmoor buffer', fullyProtonatedCharge: 0, pKa: draft.pKa },
    });
  });

  test('a true minus, a decimal comma and a plus before the charge are read as meant', () => {
    expect(checkDraft({ name: '', charge: '+2', pKa: ['\u22121,5', '2.00'] })).toEqual({
      ok: true,
      system: { name: undefined, fullyProtonatedCharge: 2, pKa: ['-1.5', '2.00'] },
    });
    expect(checkDraft({ name: '', charge: '\u22121', pKa: ['7'] })).toMatchObject({
      ok: true,
      system: { fullyProtonatedCharge: -1 },
    });
  });

  test('blank rows are not used', () => {
    expect(checkDraft({ ...draft, pKa: ['', '2.148', ' ', '7.198'] })).toMatchObject({
      ok: true,
      system: { pKa: ['2.148', '7.198'] },
    });
  });

  test('a fault stands at its own row, blank rows counted', () => {
    expect(checkDraft({ ...draft, pKa: ['', '2.148', 'seven', '71'] })).toEqual({
      ok: false,
      faults: {
        pKa: {
          2: 'Write a number such as 7.20.',
          3: 'Write a constant from \u221250 to 70, with at most 60 decimals.',
        },
      },
    });
  });

  test('each field says what it wants', () => {
    expect(checkDraft({ name: 'x'.repeat(201), charge: '1.5', pKa: [''] })).toEqual({
      ok: false,
      faults: {
        name: 'Write a name of at most 200 characters.',
        charge: 'Write a whole number from \u2212100 to 100.',
        pKa: { 0: 'Write at least one constant.' },
      },
    });
  });

  test('64 constants are the most, and the rest is not dropped silently', () => {
    const pKa = Array.from({ length: 65 }, (_, i) => String(i / 8));
    expect(checkDraft({ ...draft, pKa: pKa.slice(1) })).toMatchObject({ ok: true });
    expect(checkDraft({ ...draft, pKa })).toEqual({
      ok: false,
      faults: { pKa: { 64: 'At most 64 constants are computed; there are 65.' } },
    });
  });

  test('a half surrogate pair in a name cannot reach the address', () => {
    expect(checkDraft({ ...draft, name: 'a\ud83d' })).toMatchObject({
      system: { name: 'a\ufffd' },
    });
  });

  test('a draft made of a system gives that system', () => {
    const system = { fullyProtonatedCharge: -1, pKa: ['7.198'] };
    expect(checkDraft(draftOf(system))).toEqual({
      ok: true,
      system: { ...system, name: undefined },
    });
  });
});

describe('a pasted list', () => {
  test.each([
    ['2.148, 7.198, 12.35', ['2.148', '7.198', '12.35']],
    ['2.148\n7.198\r\n12.35\n', ['2.148', '7.198', '12.35']],
    ['2.148\t7.198\t12.35', ['2.148', '7.198', '12.35']],
    ['2.148;7.198; 12.35', ['2.148', '7.198', '12.35']],
    ['2,7,12', ['2', '7', '12']],
    ['2, 7, 12', ['2', '7', '12']],
    ['2,148; 7,198; 12,35', ['2,148', '7,198', '12,35']],
    ['2,148\n7,198', ['2,148', '7,198']],
    ['\u22121.5 2.00', ['\u22121.5', '2.00']],
    ['7.198', ['7.198']],
    ['7,198', ['7,198']],
    ['pKa 7.2', ['pKa', '7.2']],
    ['  ', []],
  ])('%j', (text, values) => {
    expect(pastedConstants(text)).toEqual(values);
  });
});
