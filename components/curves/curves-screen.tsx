import { Page } from '../shell/page';

/** Placeholder until the screen is here. */
export function CurvesScreen() {
  return <Page title="Curves">{null}</Page>;
}
