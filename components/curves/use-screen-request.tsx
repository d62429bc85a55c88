import { useMemo, useState } from 'react';
import { Choice } from '../ui/choice';
import { screenRequests, type ScreenRequest } from './screen-requests';
import type { Curves } from './use-curves';

const gives: Readonly<Record<ScreenRequest['key'], string>> = {
  curve: 'this curve',
  capacity: 'this buffer capacity',
  point: 'this isoelectric point',
};

/** The call that is looked at, and which it is where the screen is made of several. */
export function useScreenRequest({ state, shown, drawn, curve }: Curves) {
  const [chosen, setChosen] = useState<ScreenRequest['key']>();
  const grid = curve.isCurrent ? drawn?.grid : undefined;
  const { choice, conditions, total } = state;
  const requests = useMemo(
    () =>
      screenRequests(
        { asked: { choice, conditions }, total, shown, grid },
        globalThis.location.origin,
      ),
    [choice, conditions, total, shown, grid],
  );
  // A phone's view of capacity is about capacity.
  const ofView = shown[0] === 'capacity' ? 'capacity' : 'curve';
  const { key, request } = requests.find((one) => one.key === (chosen ?? ofView)) ?? requests[0];
  return {
    request,
    gives: gives[key],
    which: requests.length > 1 && (
      <Choice
        label="Which call"
        hideLabel
        options={requests.map(({ key: value, label }) => ({ value, label }))}
        value={key}
        onChange={setChosen}
      />
    ),
  };
}
