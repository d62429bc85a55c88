import { StyleSheet, View } from 'react-native';
import type { AccountAnswer } from '../../shared/account';
import { Button } from '../ui/button';
import { Failure } from '../ui/failure';
import { Icon } from '../ui/icon';
import { space } from '../ui/theme';
import { useToast } from '../ui/toast';
import { Words } from '../ui/words';
import { useChooseOrganization } from './session-queries';

interface OrganizationsProps {
  readonly who: AccountAnswer;
  readonly onChosen: () => void;
}

/** The organizations of a person: the one worked in, and a way to each other one. */
export function Organizations({ who, onChosen }: OrganizationsProps) {
  const say = useToast();
  const { mutate, isPending, error } = useChooseOrganization();
  const choose = (id: string, name: string) => {
    if (isPending) return;
    mutate(id, {
      onSuccess: () => {
        say({ text: `You work in ${name} now` });
        onChosen();
      },
    });
  };
  const others = who.organizations.filter(({ id }) => id !== who.organization.id);
  return (
    <View style={styles.list}>
      <View style={styles.current}>
        <Icon name="check" size={16} tone="well" />
        <View style={styles.words}>
          <Words kind="button">{who.organization.name}</Words>
          <Words kind="help">{`You work here, as ${who.role}`}</Words>
        </View>
      </View>
      {others.map(({ id, name, role }) => (
        <View key={id} style={styles.other}>
          <Button label={`Work in ${name}`} onPress={() => choose(id, name)} />
          <Words kind="help">{`as ${role}`}</Words>
        </View>
      ))}
      {error && <Failure error={error} />}
    </View>
  );
}

const styles = StyleSheet.create({
  list: { gap: space[3] },
  current: { flexDirection: 'row', gap: space[2] },
  words: { flex: 1 },
  other: { flexDirection: 'row', flexWrap: 'wrap', alignItems: 'center', gap: space[3] },
});
