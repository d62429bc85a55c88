import { StyleSheet, View } from 'react-native';
import type { AccountAnswer } from '../../shared/account';
import { Button } from '../ui/button';
import { Failure } from '../ui/failure';
import { space } from '../ui/theme';
import { Words } from '../ui/words';
import { Organizations } from './organizations';
import { useSignOut } from './session-queries';

interface AccountPanelProps {
  readonly who: AccountAnswer;
  readonly onClose: () => void;
}

/** Who is signed in, where they work, and the way out. */
export function AccountPanel({ who, onClose }: AccountPanelProps) {
  const { mutate, isPending, isSuccess, error } = useSignOut();
  const leaving = isPending || isSuccess;
  return (
    <View style={styles.panel}>
      <Words tone="inkSoft">{who.account.email}</Words>
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
  panel: { gap: space[4] },
  out: { flexDirection: 'row' },
});
