import { usePathname } from 'expo-router';
import { useEffect, useRef } from 'react';
import { mainId } from './skip-link';

/**
 * What a browser does by itself when a page is loaded: the focus goes to the page, so that the
 * next Tab is in it and a screen reader says where it is.
 */
export function useArrival() {
  const pathname = usePathname();
  const arrivedAt = useRef(pathname);
  useEffect(() => {
    if (arrivedAt.current === pathname) return;
    arrivedAt.current = pathname;
    document.getElementById(mainId)?.focus({ preventScroll: true });
  }, [pathname]);
}
