import { Link } from 'expo-router';
import { StyleSheet, View } from 'react-native';
import type { SystemSummary } from '../../shared/stored-system';
import { systemTitle } from '../handbook/system-title';
import { webStyle } from '../ui/web-style';
import { Words } from '../ui/words';

/** Id of the link to a system in the list: the focus is sent there. */
export const systemLinkId = (id: string) => `system-${id}`;

interface SystemLinkProps {
  readonly system: Pick<SystemSummary, 'id' | 'name'>;
  readonly chosen: boolean;
}

/** The name of a system, as the way to it. The row around it, `position: relative`, is its target. */
export function SystemLink({ system: { id, name }, chosen }: SystemLinkProps) {
  return (
    <Link href={`/systems/${id}`} asChild>
      <View id={systemLinkId(id)} aria-current={chosen ? 'page' : undefined} style={styles.link}>
        <Words kind="button">{systemTitle(name)}</Words>
        <View style={[StyleSheet.absoluteFill, styles.row]} />
      </View>
    </Link>
  );
}

const styles = StyleSheet.create({
  // Its own box must not catch the absolute child: the row does.
  link: webStyle({ position: 'static' }),
  // Over what else stands in the row.
  row: { zIndex: 1 },
});
