import {
  changedConditions,
  conditionsAsked,
  firstConditions,
  readConditions,
} from '../../../components/curves/curve-conditions';
import { nextBeside, firstState } from '../../../components/curves/curves-state';

describe('the conditions of a curve', () => {
  test('a first ionic strength brings Davies, as it does in the API, and taking it away ideal', () => {
    const salty = changedConditions(firstConditions, { ionicStrength: '0.15' });
    expect(salty.activityModel).toBe('davies');
    expect(changedConditions(salty, { ionicStrength: '0' })).toEqual(firstConditions);
  });

  test('a model that was chosen stays', () => {
    const chosen = {
      ...firstConditions,
      ionicStrength: '0.05',
      activityModel: 'guntelberg',
    } as const;
    expect(changedConditions(chosen, { ionicStrength: '0.1' }).activityModel).toBe('guntelberg');
    expect(changedConditions(chosen, { temperature: '37' }).activityModel).toBe('guntelberg');
  });

  test('an ionic strength is asked for with its model, ideal too', () => {
    expect(conditionsAsked(firstConditions)).toEqual({});
    expect(conditionsAsked({ ...firstConditions, ionicStrength: '0.1' })).toEqual({
      conditions: { ionicStrength: '0.1', activityModel: 'ideal' },
    });
    expect(conditionsAsked({ ...firstConditions, temperature: '37' })).toEqual({
      conditions: { temperature: '37' },
    });
  });

  test('an address with an ionic strength alone means Davies', () => {
    const { conditions } = readConditions(new Map([['I', '0.1']]));
    expect(conditions.activityModel).toBe('davies');
  });

  test('the first curve to compare with is in salt, or without it; the second is warm', () => {
    const beside = nextBeside(firstState);
    expect(beside.conditions).toMatchObject({ ionicStrength: '0.15', activityModel: 'davies' });
    const salty = { ...firstState, conditions: beside.conditions };
    expect(nextBeside(salty).conditions).toEqual(firstConditions);
    expect(nextBeside({ ...salty, beside: [beside] }).conditions.temperature).toBe('37');
  });
});
