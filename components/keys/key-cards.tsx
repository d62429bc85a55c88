import { StyleSheet, View } from 'react-native';
import { Button } from '../ui/button';
import { Moment } from '../ui/moment';
import { space, useTheme } from '../ui/theme';
import { Words } from '../ui/words';
import { keyElementId, MayDo, PublicPart } from './key-facts';
import { canRevoke, standingOf } from './key-standing';
import { KeyStatus } from './key-status';
import type { KeysViewProps } from './keys-view';

const endWords = {
  active: ', ends ',
  'issuer-left': ', ends ',
  expired: ', expired ',
  revoked: ', revoked ',
} as const;

/** Keys on a phone, parted by rules: name and state on the first line. */
export function KeyCards({ keys, now, onRevoke }: KeysViewProps) {
  const { colours } = useTheme();
  return (
    <View role="list">
      {keys.map((key) => (
        <View
          key={key.id}
          id={keyElementId(key)}
          tabIndex={-1}
          role="listitem"
          style={[styles.card, { borderTopColor: colours.rule }]}
        >
          <View style={styles.line}>
            <View style={styles.grow}>
              <Words kind="section">{key.name}</Words>
            </View>
            <KeyStatus {...standingOf(key, now)} />
          </View>
          <PublicPart {...key} />
          <View style={[styles.line, styles.facts]}>
            <View style={styles.grow}>
              <MayDo {...key} />
              <Words>
                {key.lastUsedAt === null ? (
                  'Never used'
                ) : (
                  <>
                    {'Last used '}
                    <Moment at={key.lastUsedAt} now={now} />
                  </>
                )}
              </Words>
              <Words kind="help">
                {`Issued by ${key.issuer.name} `}
                <Moment at={key.createdAt} now={now} />
                {endWords[key.state]}
                <Moment at={key.revokedAt ?? key.expiresAt} now={now} />
              </Words>
            </View>
            {canRevoke(key) && (
              <Button label="Revoke" about={key.name} onPress={() => onRevoke(key)} />
            )}
          </View>
        </View>
      ))}
    </View>
  );
}

const styles = StyleSheet.create({
  card: { borderTopWidth: 1, paddingVertical: space[3] },
  line: { flexDirection: 'row', alignItems: 'flex-start', gap: space[3] },
  facts: { marginTop: space[2], alignItems: 'flex-end' },
  grow: { flex: 1, minWidth: 0, gap: 2 },
});
