import { useRef } from 'react';
import type { PointerEvent as NativePointerEvent } from 'react-native';

/** A finger must travel this far sideways before it drags, px: less is a tap, or a scroll begun. */
const threshold = 4;

/**
 * Pointer handlers that move a cursor over a plot. A mouse or pen moves it at once. A finger moves
 * it by a tap or a sideways drag; an upward drag stays the page's (with `touch-action: pan-y`).
 *
 * @param onMove takes the place of the pointer, px from the left edge of the plot's element.
 */
export function usePlotDrag(onMove: (x: number) => void) {
  const press = useRef<{ id: number; from: number; dragging: boolean } | null>(null);
  const place = ({ currentTarget, nativeEvent }: NativePointerEvent) =>
    nativeEvent.clientX - currentTarget.getBoundingClientRect().left;
  const end = () => {
    press.current = null;
  };
  return {
    onPointerDown: (event: NativePointerEvent) => {
      const { pointerId, pointerType, button, isPrimary, clientX } = event.nativeEvent;
      if (!isPrimary || button !== 0) return;
      const dragging = pointerType !== 'touch';
      press.current = { id: pointerId, from: clientX, dragging };
      event.currentTarget.setPointerCapture(pointerId);
      if (dragging) onMove(place(event));
    },
    onPointerMove: (event: NativePointerEvent) => {
      const held = press.current;
      if (!held || held.id !== event.nativeEvent.pointerId) return;
      held.dragging ||= Math.abs(event.nativeEvent.clientX - held.from) > threshold;
      if (held.dragging) onMove(place(event));
    },
    onPointerUp: (event: NativePointerEvent) => {
      if (press.current && !press.current.dragging) onMove(place(event));
      end();
    },
    onPointerCancel: end,
  };
}
