import { curveCsv } from '../../../components/curves/curve-csv';
import { conditionsText } from '../../../components/curves/conditions-of';
import type { CurveAsked } from '../../../components/curves/curve-asked';
import { firstConditions } from '../../../components/curves/curve-conditions';
import { layers, type Layer } from '../../../components/curves/curves-state';
import { describeCurve, describeReading } from '../../../components/curves/describe';
import { drawnCurve } from '../../../components/curves/drawn-curve';
import { noExtras } from '../../../components/curves/figure-extras';
import { figureLayout } from '../../../components/curves/figure-layout';
import { exactReading } from '../../../components/curves/follow-curve';
import { readOutText } from '../../../components/curves/read-out-text';
import type { Constant } from '../../../shared/constant';
import type { FractionsAnswer } from '../../../shared/fractions';
import type { WarningCode } from '../../../shared/model';

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
  effectivePKa: ['2.14800', '7.19800', '12.3500'],
  predominance: [
    range(0, null, '2.14800'),
    range(1, '2.14800', '7.19800'),
    range(2, '7.19800', '12.3500'),
    range(3, '12.3500', null),
  ],
  model: {
    conditions: { temperature: '25', ionicStrength: '0', activityModel: 'ideal' },
    warnings: [],
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
const asked: CurveAsked = {
  choice: { kind: 'stored', id: 'phosphoric-acid' },
  conditions: firstConditions,
};
const drawn = drawnCurve(asked, phosphoric);
const reading = exactReading(phosphoric);
if (!reading) throw new Error('The answer has a point.');

describe('what is drawn', () => {
  test('neighbours meet at the constants as given, not as padded by the answer', () => {
    expect(drawn.meetings.map(({ text }) => text)).toEqual(['2.148', '7.198', '12.35']);
  });

  test('around a form that never predominates its neighbours meet at a mean', () => {
    const inverted: CurveAsked = {
      choice: { kind: 'typed', system: { fullyProtonatedCharge: 0, pKa: ['9', '4'] } },
      conditions: firstConditions,
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
  const textFor = (constants: readonly object[], ...codes: WarningCode[]) => {
    const warnings = codes.map((code) => ({ code, message: '' }));
    const model = { ...phosphoric.model, constantsUsed: [{ ...used, constants }], warnings };
    return conditionsText(
      drawnCurve(asked, { ...phosphoric, model } as unknown as FractionsAnswer),
    );
  };

  test('are the model’s for thermodynamic constants at its temperature', () => {
    expect(conditionsText(drawn)).toBe('25 °C · I = 0 · ideal');
  });

  test('are the constants’ own where these were measured elsewhere', () => {
    const at = (ionicStrength: string | null) =>
      determined({ kind: 'concentration', ionicStrength });
    const medium = 'constants-at-their-medium';
    expect(textFor([at('1'), at('0.1')], medium)).toBe('25 °C · I = 1, 0.1 · as given');
    expect(textFor([at(null)], medium)).toBe('25 °C · I not stated · as given');
    const warmer = [determined({ temperature: '18' })];
    expect(textFor(warmer, 'pka-not-temperature-corrected')).toBe('18 °C · I = 0 · as given');
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
    expect(curveCsv({ drawn, shown: ['fractions'], extras: noExtras })).toBe(
      'pH,H3PO4,H2PO4^-,HPO4^2-,PO4^3-,mean charge,' +
        'temperature/°C,ionic strength/(mol/L),activity model\r\n' +
        '7.40,0.00000215937,0.385768,0.614223,0.00000689170,-1.614235,25,0,ideal\r\n',
    );
  });

  test('the read-out holds every digit, cell by cell', () => {
    expect(readOutText(drawn, reading, ['fractions'], noExtras).split('\n')).toEqual([
      'pH\t\t7.40',
      'conditions\t\t25 °C · I = 0 · ideal',
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
  const three = ['fractions', 'predominance', 'charge'] as const;
  const four = [...three, 'capacity'] as const;
  const wide = (height: number, layers: readonly Layer[]) =>
    figureLayout({ width: 640, height, layers, compact: false });

  test.each([
    [400, three],
    [640, three],
    [900, three],
    [640, four],
    [768, four],
    [900, layers],
  ] as const)('at %s px the fractions are at least twice any other', (height, shown) => {
    const { panels, ...layout } = wide(height, shown);
    const { fractions, ...others } = panels;
    const highest = Math.max(...Object.values(others).map((rect) => rect.height));
    expect(fractions?.height).toBeGreaterThanOrEqual(2 * highest);
    expect(layout.height).toBeCloseTo(height);
  });

  test('where the layers do not fit they keep their least heights, and the page scrolls', () => {
    const { panels, height } = wide(400, layers);
    expect(height).toBeGreaterThan(400);
    expect(panels['lg-c']?.height).toBeGreaterThanOrEqual(96);
  });

  test('panels stack without overlap over one axis', () => {
    const { panels, axis } = wide(768, layers);
    const ends = Object.values(panels).map((rect) => [rect.y, rect.y + rect.height]);
    const edges = [...ends.flat(), axis];
    expect(edges).toEqual([...edges].sort((a, b) => a - b));
    expect(ends).toHaveLength(5);
  });

  test('on a phone 360×640 the fractions keep 200 px', () => {
    const shown = ['fractions', 'predominance'] as const;
    const { panels } = figureLayout({ width: 360, height: 386, layers: shown, compact: true });
    expect(panels.fractions?.height).toBeGreaterThanOrEqual(200);
  });
});
