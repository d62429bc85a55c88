/** A total as its figures, in mmol/L: `50`, `0.25`. */
export const totalInWords = (molar: number | string): string =>
  String(Number((Number(molar) * 1000).toPrecision(12)));
