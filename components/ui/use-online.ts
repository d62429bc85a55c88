import { onlineManager } from '@tanstack/react-query';
import { useSyncExternalStore } from 'react';

const subscribe = (changed: () => void) => onlineManager.subscribe(changed);
const isOnline = () => onlineManager.isOnline();

/** Whether the browser has a connection at all. */
export const useOnline = () => useSyncExternalStore(subscribe, isOnline);
