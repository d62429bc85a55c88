import { largestCharge, usableTo } from '../../../../server/chem/activity/ranges';

describe('how far the models go', () => {
  test('as usually quoted (Davies 1962; recalled)', () => {
    expect(usableTo('debye-huckel')).toBe('0.005');
    expect(usableTo('extended-debye-huckel')).toBe('0.1');
    expect(usableTo('guntelberg')).toBe('0.1');
    expect(usableTo('davies')).toBe('0.5');
    expect(usableTo('specific-ion-interaction')).toBe('1');
    expect(usableTo('pitzer')).toBe('6');
  });

  test('the ideal model has no end, for it claims nothing', () => {
    expect(usableTo('ideal')).toBeUndefined();
  });

  test('charges beyond six are no model’s', () => {
    expect(largestCharge).toBe(6);
  });
});
