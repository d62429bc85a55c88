import { curveCsv } from '../../../components/curves/curve-csv';
import { conditionsText } from '../../../components/curves/conditions-of';
import type { Choice } from '../../../components/constants/choice';
import { describeCurve, describeReading } from '../../../components/curves/describe';
import { drawnCurve } from '../../../components/curves/drawn-curve';
import { figureLayout } from '../../../components/curves/figure-layout';
import { exactReading } from '../../../components/curves/follow-curve';
import { readOutText } from '../../../components/curves/read-out-text';
import type { Constant } from '../../../shared/constant';
import type { FractionsAnswer } from '../../../shared/fractions';

const range = (species: number, from: string | null, to: string | null) => ({ species, from, to });
const determined = (known: Partial<Constant>) => ({
  kind: 'thermodynamic',
  temperature: '25',
  ionicStrength: '0',
  ...known,
});
const phosphoric = {
  name: 'phosphoric acid',
  species: ['H3PO4', 'H2PO4^-', 'HPO4^2-', 'PO4^3-'].map((formula, index) => ({
    index,
    charge: -index,
    protonsLost: index,
    formula,
  })),
  points: [
    {
      pH: '7.40',
      fractions: ['0.00000215937', '0.385768', '0.614223', '0.00000689170'],
      neighbourRatios: ['178649', '1.59221', '0.0000112202'],
      meanCharge: '-1.614235',
      predominant: 2,
    },
  ],
  predominance: [
    range(0, null, '2.14800'),
    range(1, '2.14800', '7.19800'),
    range(2, '7.19800', '12.3500'),
    range(3, '12.3500', null),
  ],
  model: {
    conditions: { temperature: '25', ionicStrength: '0' },
    constantsUsed: [
      {
        name: 'phosphoric acid',
        fullyProtonatedCharge: 0,
        pKa: ['2.148', '7.198', '12.35'],
        constants: ['2.148', '7.198', '12.35'].map((value, i) =>
          determined({ value, step: i + 1 }),
        ),
      },
    ],
  },
} as unknown as FractionsAnswer;
const choice: Choice = { kind: 'stored', id: 'phosphoric-acid' };
const drawn = drawnCurve(choice, phosphoric);
const reading = exactReading(phosphoric);
if (!reading) throw new Error('The answer has a point.');

describe('what is drawn', () => {
  test('neighbours meet at the constants as given, not as padded by the answer', () => {
    expect(drawn.meetings.map(({ text }) => text)).toEqual(['2.148', '7.198', '12.35']);
  });

  test('around a form that never predominates its neighbours meet at a mean', () => {
    const inverted: Choice = {
      kind: 'typed',
      system: { fullyProtonatedCharge: 0, pKa: ['9', '4'] },
    };
    const answer = {
      ...phosphoric,
      species: phosphoric.species.slice(0, 3),
      predominance: [range(0, null, '6.50000'), range(2, '6.50000', null)],
    };
    expect(drawnCurve(inverted, answer).meetings).toEqual([
      { before: 0, after: 2, pH: 6.5, text: '6.5' },
    ]);
  });
});

describe('the conditions on a plot', () => {
  const [used] = phosphoric.model.constantsUsed;
  const textFor = (constants: readonly object[]) =>
    conditionsText(
      drawnCurve(choice, {
        ...phosphoric,
        model: { ...phosphoric.model, constantsUsed: [{ ...used, constants }] },
      } as unknown as FractionsAnswer),
    );

  test('are the model’s for thermodynamic constants at its temperature', () => {
    expect(conditionsText(drawn)).toBe('25 °C · I = 0 · ideal');
  });

  test('are the constants’ own where these were measured elsewhere', () => {
    const at = (ionicStrength: string | null) =>
      determined({ kind: 'concentration', ionicStrength });
    expect(textFor([at('1'), at('0.1')])).toBe('25 °C · I = 1, 0.1 · as given');
    expect(textFor([at(null)])).toBe('25 °C · I not stated · as given');
    expect(textFor([determined({ temperature: '18' })])).toBe('18 °C · I = 0 · as given');
  });
});

describe('the figure in words', () => {
  test('says what is present', () => {
    expect(describeReading(drawn, reading)).toBe(
      'pH 7.40: H P O4, charge minus 2 predominates, fraction 0.614, mean charge minus 1.61',
    );
  });

  test('says range, order and reading', () => {
    const sentence = describeCurve(drawn, reading);
    expect(sentence).toContain('Fractions of the 4 forms of phosphoric acid over pH 0 to 14.');
    expect(sentence).toContain('Predominant: H3 P O4, from pH 2.148 H2 P O4, charge minus 1');
  });
});

describe('what leaves the screen', () => {
  test('the CSV holds the answer digit for digit', () => {
    expect(curveCsv(drawn)).toBe(
      'pH,H3PO4,H2PO4^-,HPO4^2-,PO4^3-,mean charge\r\n' +
        '7.40,0.00000215937,0.385768,0.614223,0.00000689170,-1.614235\r\n',
    );
  });

  test('the read-out holds every digit, cell by cell', () => {
    expect(readOutText(drawn, reading).split('\n')).toEqual([
      'pH\t\t7.40',
      'form\tcharge\tfraction',
      'H3PO4\t0\t0.00000215937',
      'H2PO4^-\t-1\t0.385768',
      'HPO4^2-\t-2\t0.614223',
      'PO4^3-\t-3\t0.00000689170',
      'mean charge\t\t-1.614235',
    ]);
  });
});

describe('the layout of the figure', () => {
  const all = ['fractions', 'predominance', 'charge'] as const;

  test.each([400, 520, 640, 768, 900])(
    'at %s px the fractions are at least twice any other',
    (height) => {
      const { fractions, stair, charge, ...layout } = figureLayout({
        width: 640,
        height,
        layers: all,
        compact: false,
      });
      const others = Math.max(stair?.height ?? 0, charge?.height ?? 0);
      expect(fractions?.height).toBeGreaterThanOrEqual(2 * others);
      expect(layout.height).toBeCloseTo(height);
    },
  );

  test('panels stack without overlap over one axis', () => {
    const { fractions, stair, charge, axis } = figureLayout({
      width: 640,
      height: 768,
      layers: all,
      compact: false,
    });
    const ends = [fractions, stair, charge].map((rect) => [
      rect?.y ?? NaN,
      (rect?.y ?? NaN) + (rect?.height ?? NaN),
    ]);
    const edges = [...ends.flat(), axis];
    expect(edges).toEqual([...edges].sort((a, b) => a - b));
  });

  test('on a phone 360×640 the fractions keep 200 px', () => {
    const layers = ['fractions', 'predominance'] as const;
    const { fractions } = figureLayout({ width: 360, height: 386, layers, compact: true });
    expect(fractions?.height).toBeGreaterThanOrEqual(200);
  });
});
