import { pHAt, pHEnd, pHStep, pHWithin, typedPH } from '../../../components/curves/ph-steps';

const range = [-1, 14] as const;

describe('the pH of the cursor', () => {
  test('the pointer sets two decimals', () => {
    expect(pHAt(7.3951, range)).toBe('7.40');
    expect(pHAt(-0.001, range)).toBe('0.00');
    expect(pHAt(-0.3, range)).toBe('-0.30');
    expect(pHAt(99, range)).toBe('14.00');
    expect(pHAt(-99, range)).toBe('-1.00');
  });

  test('steps are exact and never drift', () => {
    let pH = '7.40';
    for (let i = 0; i < 660; i++) pH = pHStep(pH, '0.01', 1, range);
    expect(pH).toBe('14.00');
    for (let i = 0; i < 150; i++) pH = pHStep(pH, '0.1', -1, range);
    expect(pH).toBe('-1.00');
  });

  test('decimals that were typed are kept', () => {
    expect(pHStep('7.4035', '0.01', 1, range)).toBe('7.4135');
    expect(pHStep('0.005', '0.01', -1, range)).toBe('-0.005');
  });

  test('the ends of the range hold', () => {
    expect(pHStep('13.80', '0.5', 1, range)).toBe('14.00');
    expect(pHEnd('start', range)).toBe('-1.00');
    expect(pHEnd('end', range)).toBe('14.00');
    expect(pHWithin('20', range)).toBe('14.00');
    expect(pHWithin('7.405', range)).toBe('7.405');
  });

  test.each([
    ['7.4', '7.40'],
    ['7', '7.00'],
    [' 7.4035 ', '7.4035'],
    ['\u22120.5', '-0.50'],
    ['7,25', '7.25'],
    ['-0', '0.00'],
    ['1e1', '10.00'],
  ])('%j typed is pH %s', (text, pH) => {
    expect(typedPH(text, range)).toEqual({ ok: true, pH });
  });

  test.each(['', '.', '7.', 'seven', '7.4.0', '1,2,3', 'NaN', 'Infinity'])(
    '%j typed is no pH, and the form is shown',
    (text) => {
      expect(typedPH(text, range)).toEqual({ ok: false, error: 'Write a pH such as 7.40.' });
    },
  );

  test('a pH beyond the plot names the plot’s range', () => {
    const refusal = { ok: false, error: 'Write a pH from \u22121 to 14.' };
    expect(typedPH('14.01', range)).toEqual(refusal);
    expect(typedPH('-1.0001', range)).toEqual(refusal);
  });
});
