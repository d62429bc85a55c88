import { StyleSheet, View } from 'react-native';
import type { FigureSave } from '../chart/export/use-figure-files';
import { Button } from '../ui/button';
import { space } from '../ui/theme';
import { Words } from '../ui/words';

interface FileButtonsProps {
  readonly save: FigureSave;
  /** What the numbers are: `Every point of the curve, as the API gave it.` */
  readonly numbers: string;
}

/** The files a screen can leave as. */
export function FileButtons({ save, numbers }: FileButtonsProps) {
  const files = [
    { kind: 'csv', label: 'Numbers (CSV)', note: numbers },
    { kind: 'svg', label: 'Figure (SVG)', note: 'For print and for editing; brings its fonts.' },
    {
      kind: 'png',
      label: 'Figure (PNG)',
      note: 'For slides and reports, at three times its size.',
    },
  ] as const;
  return (
    <View style={styles.list}>
      {files.map(({ kind, label, note }) => (
        <View key={kind} style={styles.file}>
          <Button icon="download" label={label} onPress={() => void save(kind)} />
          <Words kind="help">{note}</Words>
        </View>
      ))}
    </View>
  );
}

const styles = StyleSheet.create({
  list: { gap: space[4] },
  file: { gap: space[1] },
});
