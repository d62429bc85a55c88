/** Text without half surrogate pairs, which no address can carry. */
export const wellFormed = (text: string) => text.replace(/\p{Cs}/gu, '\ufffd');
