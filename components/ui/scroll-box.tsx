import { useLayoutEffect, useRef, useState, type ReactNode } from 'react';
import { View } from 'react-native';
import { elementOf } from './element';
import { webStyle } from './web-style';

interface ScrollBoxProps {
  /** What scrolls, said when the keyboard reaches it. */
  readonly label: string;
  /** px; without it only the width is bounded. */
  readonly maxHeight?: number;
  readonly children: ReactNode;
}

/**
 * Wide content that scrolls inside itself, so that the page never scrolls sideways. A Tab stop
 * only while there is something to scroll to.
 */
export function ScrollBox({ label, maxHeight, children }: ScrollBoxProps) {
  const box = useRef<View>(null);
  const [overflows, setOverflows] = useState(false);
  useLayoutEffect(() => {
    const element = elementOf(box.current);
    if (!element) return;
    const measure = () =>
      setOverflows(
        element.scrollWidth > element.clientWidth || element.scrollHeight > element.clientHeight,
      );
    const observer = new ResizeObserver(measure);
    observer.observe(element);
    for (const child of Array.from(element.children)) observer.observe(child);
    return () => observer.disconnect();
  }, []);
  return (
    <View
      ref={box}
      // Not region: react-native-web would make another element of it and lose the one observed.
      role={overflows ? 'group' : undefined}
      aria-label={overflows ? label : undefined}
      tabIndex={overflows ? 0 : undefined}
      style={webStyle({ overflow: 'auto', maxWidth: '100%', maxHeight })}
    >
      {children}
    </View>
  );
}
