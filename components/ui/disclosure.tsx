import { useId, useState, type ReactNode } from 'react';
import { Pressable, StyleSheet, View } from 'react-native';
import { Icon } from './icon';
import { space } from './theme';
import { softColour } from './web-style';
import { Words } from './words';

interface DisclosureProps {
  readonly label: string;
  readonly children: ReactNode;
  readonly startsOpen?: boolean;
}

/** Something that most readers can do without, behind one press. */
export function Disclosure({ label, children, startsOpen = false }: DisclosureProps) {
  const [open, setOpen] = useState(startsOpen);
  const id = useId();
  return (
    <View>
      <Pressable
        role="button"
        aria-expanded={open}
        aria-controls={open ? id : undefined}
        onPress={() => setOpen(!open)}
        style={[styles.row, softColour]}
      >
        <View style={open && styles.turned}>
          <Icon name="chevron-down" size={16} tone="well" />
        </View>
        <Words kind="button" tone="well">
          {label}
        </Words>
      </Pressable>
      {open && (
        <View id={id} style={styles.content}>
          {children}
        </View>
      )}
    </View>
  );
}

const styles = StyleSheet.create({
  row: {
    flexDirection: 'row',
    alignItems: 'center',
    alignSelf: 'flex-start',
    gap: space[1],
    minHeight: 44,
  },
  turned: { transform: [{ rotate: '180deg' }] },
  content: { paddingTop: space[1] },
});
