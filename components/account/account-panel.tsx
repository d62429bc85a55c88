import { StyleSheet, View } from 'react-native';
import type { AccountAnswer } from '../../shared/account';
import { Button } from '../ui/button';
import { Failure } from '../ui/failure';
import { space, useTheme } from '../ui/theme';
import { Words } from '../ui/words';
import { Organizations } from './organizations';
import { useSignOut } from './session-queries';

interface AccountPanelProps {
  readonly who: AccountAnswer;
  readonly onClose: () => void;
}

/** Who is signed in, where they work, and the way out. */
export function AccountPanel({ who, onClose }: AccountPanelProps) {
  const { colours } = useTheme();
  const { mutate, isPending, isSuccess, error } = useSignOut();
  const leaving = isPending || isSuccess;
  return (
    <View style={[styles.panel, { borderTopColor: colours.rule }]}>
      <View>
        <Words kind="section">{who.account.name}</Words>
        <Words tone="inkSoft">{who.account.email}</Words>
      </View>
      <Organizations who={who} onChosen={onClose} />
      {error && <Failure error={error} />}
      <View style={styles.out}>
        <Button
          label={leaving ? 'Signing out …' : 'Sign out'}
          onPress={() => {
            if (!leaving) mutate();
          }}
        />
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  panel: { gap: space[4], paddingTop: space[4], borderTopWidth: 1 },
  out: { flexDirection: 'row' },
});
