import type { WrittenRequest } from '../request/request-code';
import type { CurveAsked } from './curve-asked';
import { givenConstants } from './curve-asked';
import { gridOf, type CurveGrid } from './curve-grid';
import { curveRequest } from './curve-request';
import type { Layer } from './curves-state';
import { capacityBody, pointBody } from './layer-bodies';

interface OnScreen {
  readonly asked: CurveAsked;
  /** mol/L. */
  readonly total: string;
  readonly shown: readonly Layer[];
  /** The grid that is drawn over, once it is known. */
  readonly grid: CurveGrid | undefined;
}

export interface ScreenRequest {
  readonly key: 'curve' | 'capacity' | 'point';
  /** What the call gives. */
  readonly label: string;
  readonly request: WrittenRequest;
}

/** The keyed calls that the shown layers are made of; the curve's own is the first. */
export function screenRequests({ asked, total, shown, grid }: OnScreen, origin: string) {
  const over = grid ?? gridOf(givenConstants(asked.choice));
  const curve: ScreenRequest = {
    key: 'curve',
    label: 'Fractions and charge',
    request: curveRequest(asked, origin, over),
  };
  const capacity: ScreenRequest = {
    key: 'capacity',
    label: 'Buffer capacity',
    request: {
      url: `${origin}/v1/buffer-capacity`,
      body: capacityBody(asked, total, over),
      result: 'capacity',
    },
  };
  const point: ScreenRequest = {
    key: 'point',
    label: 'Isoelectric point',
    request: { url: `${origin}/v1/isoelectric-point`, body: pointBody(asked), result: 'point' },
  };
  return [
    curve,
    ...(shown.includes('capacity') || shown.includes('lg-c') ? [capacity] : []),
    ...(shown.includes('isoelectric-point') ? [point] : []),
  ] as const;
}
