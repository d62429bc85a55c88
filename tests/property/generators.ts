import fc from 'fast-check';
import type { AcidBaseSystem } from '../../server/chem';

/** An integer number of units 10^−places as a decimal string. */
export function decimalOf(units: bigint, places: number): string {
  const digits = (units < 0n ? -units : units).toString().padStart(places + 1, '0');
  const whole = digits.slice(0, digits.length - places);
  const decimals = digits.slice(digits.length - places);
  return `${units < 0n ? '-' : ''}${whole}${places === 0 ? '' : `.${decimals}`}`;
}

const places = fc.constantFrom(0, 1, 2, 3, 3, 12, 60);

/** A decimal within a closed range of integers, mostly with few places, at times with 60. */
export const decimalWithin = (low: number, high: number) =>
  places.chain((count) => {
    const scale = 10n ** BigInt(count);
    return fc
      .bigInt({ min: BigInt(low) * scale, max: BigInt(high) * scale })
      .map((units) => decimalOf(units, count));
  });

/** Values a tiny distance from an integer: their powers of ten nearly are powers of ten. */
const nearInteger = (low: number, high: number) =>
  fc
    .tuple(fc.integer({ min: low + 1, max: high - 1 }), fc.integer({ min: -2, max: 2 }))
    .map(([whole, tiny]) => decimalOf(BigInt(whole) * 10n ** 60n + BigInt(tiny), 60));

const integerIn = (low: number, high: number) => fc.integer({ min: low, max: high }).map(String);

const value = (low: number, high: number) =>
  fc.oneof(
    { weight: 4, arbitrary: decimalWithin(low, high) },
    { weight: 2, arbitrary: integerIn(low, high) },
    { weight: 1, arbitrary: nearInteger(low, high) },
  );

/** Constants: anywhere (so mostly inverted somewhere), in order, equal, or by integers apart. */
export const constants = (low = -50, high = 70, most = 6) => {
  const several = (each: fc.Arbitrary<string>, maxLength = most) =>
    fc.array(each, { minLength: 1, maxLength });
  const middle = Math.trunc((low + high) / 2);
  return fc.oneof(
    { weight: 3, arbitrary: several(value(low, high)) },
    {
      weight: 3,
      arbitrary: several(value(Math.max(low, 0), Math.min(high, 14))).map((list) =>
        list.toSorted((a, b) => Number(a) - Number(b)),
      ),
    },
    {
      weight: 2,
      arbitrary: fc
        .tuple(value(low, high), fc.integer({ min: 1, max: 8 }))
        .map(([each, count]) => Array.from({ length: count }, () => each)),
    },
    { weight: 2, arbitrary: several(integerIn(middle - 3, middle + 3)) },
    { weight: 1, arbitrary: several(nearInteger(middle - 2, middle + 2), 8) },
  );
};

export const systems = (low?: number, high?: number, most?: number): fc.Arbitrary<AcidBaseSystem> =>
  fc.record({
    fullyProtonatedCharge: fc.integer({ min: -4, max: 8 }),
    pKa: constants(low, high, most),
  });

/** Systems of 64 protons, close together or far apart. */
export const largeSystems: fc.Arbitrary<AcidBaseSystem> = fc.record({
  fullyProtonatedCharge: fc.integer({ min: -100, max: 100 }),
  pKa: fc.oneof(
    fc.array(decimalWithin(-50, 70), { minLength: 64, maxLength: 64 }),
    fc.integer({ min: -50, max: 70 }).map((each) => Array.from({ length: 64 }, () => `${each}`)),
  ),
});

export const pHWithin = (low = -20, high = 40) => value(low, high);

/** 1 and 60 as often as all between. */
export const digitCounts = fc.oneof(
  fc.constantFrom(1, 2, 60),
  fc.integer({ min: 1, max: 60 }),
  fc.constantFrom(16, 34),
);
