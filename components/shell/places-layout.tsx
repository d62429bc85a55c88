import { Slot } from 'expo-router';
import { RouteError } from './route-error';
import { Shell } from './shell';
import { useArrival } from './use-arrival';

/** A place that fails, or whose code cannot be loaded, fails alone: the shell stays. */
export const placesSettings = { screenErrorBoundary: RouteError };

/** The layout of the places: one shell that stays while they change. */
export function PlacesLayout() {
  useArrival();
  return (
    <Shell>
      <Slot />
    </Shell>
  );
}
