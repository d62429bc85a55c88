import { Slot } from 'expo-router';
import { Shell } from './shell';

/** The layout of the places: one shell that stays while they change. */
export function PlacesLayout() {
  return (
    <Shell>
      <Slot />
    </Shell>
  );
}
