import { conditionFaults } from '../../../components/conditions/condition-faults';
import { ProblemError } from '../../../shared/client';
import type { Fault } from '../../../shared/problem';

const refused = (...errors: Fault[]) =>
  new ProblemError({
    type: 'http://localhost/problems/no-answer',
    title: 'The chemistry has no such answer',
    status: 422,
    requestId: '0b7c1a52',
    errors,
  });

describe('what a service says of the conditions', () => {
  test('stands at the field to change, without words for callers of the API', () => {
    const { at, passable } = conditionFaults(
      refused({
        pointer: '/conditions/activityModel',
        code: 'outside-model-range',
        detail:
          'Davies’s equation is good to I = 0.5 mol/L; here I = 5 mol/L. Choose a model that reaches further, or "outOfRange": "compute".',
      }),
    );
    expect(at).toEqual({
      ionicStrength:
        'Davies’s equation is good to I = 0.5 mol/L; here I = 5 mol/L. Choose a model that reaches further.',
    });
    expect(passable).toBe(true);
  });

  test('constants outside their medium are changed by the ionic strength', () => {
    const fault = { pointer: '/system/id', code: 'constants-outside-medium', detail: 'No.' };
    expect(conditionFaults(refused(fault)).at).toEqual({ ionicStrength: 'No.' });
  });

  test('what no field shows is kept, and then nothing can be passed over', () => {
    const fault = { pointer: '/pH/step', code: 'over-limit', detail: 'Too fine.' };
    expect(conditionFaults(refused(fault))).toEqual({
      at: {},
      elsewhere: ['Too fine.'],
      passable: false,
    });
  });

  test('no error says nothing', () => {
    expect(conditionFaults(null)).toEqual({ at: {}, elsewhere: [], passable: false });
    expect(conditionFaults(new Error('x')).passable).toBe(false);
  });
});
