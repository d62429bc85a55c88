/** A point in px, y downwards. */
export interface Point {
  readonly x: number;
  readonly y: number;
}

/** A rectangle in px, from its top left corner. */
export interface Rect extends Point {
  readonly width: number;
  readonly height: number;
}

export const right = (rect: Rect) => rect.x + rect.width;
export const bottom = (rect: Rect) => rect.y + rect.height;
export const centre = (rect: Rect): Point => ({
  x: rect.x + rect.width / 2,
  y: rect.y + rect.height / 2,
});

export const inflate = (rect: Rect, by: number): Rect => ({
  x: rect.x - by,
  y: rect.y - by,
  width: rect.width + 2 * by,
  height: rect.height + 2 * by,
});

export const overlaps = (a: Rect, b: Rect) =>
  a.x < right(b) && b.x < right(a) && a.y < bottom(b) && b.y < bottom(a);

export const contains = (outer: Rect, inner: Rect) =>
  inner.x >= outer.x &&
  inner.y >= outer.y &&
  right(inner) <= right(outer) &&
  bottom(inner) <= bottom(outer);

export const distance = (a: Point, b: Point) => Math.hypot(a.x - b.x, a.y - b.y);

export const clamp = (value: number, from: number, to: number) =>
  Math.min(to, Math.max(from, value));
