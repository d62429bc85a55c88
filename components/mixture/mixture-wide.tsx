import { useState } from 'react';
import { StyleSheet, useWindowDimensions, View } from 'react-native';
import { clamp } from '../chart/geometry';
import { FileButtons } from '../leaving/file-buttons';
import { drawerHeights, RequestDrawer } from '../request/request-drawer';
import { Page } from '../shell/page';
import { Button } from '../ui/button';
import { Dialog } from '../ui/dialog';
import { space } from '../ui/theme';
import { useCopy } from '../ui/use-copy';
import { useLayout } from '../ui/use-layout';
import { FlaskInputs } from './flask-inputs';
import { MixtureResult } from './mixture-result';
import { linkTo } from './use-address';
import type { Mixture } from './use-mixture';
import { mixtureRequest, numbersHeld, useMixtureFiles } from './use-mixture-files';

const inputsWidth = { narrow: 320, wide: 352 } as const;
/** Head of the page, the answer over the plot, and some of the table under it, px. */
const besidePlot = 76 + 116 + 150;
const resultAtMost = 960;

/** From 900 px: the flask left, what comes of it right. */
export function MixtureWide({ mixture }: { readonly mixture: Mixture }) {
  const { state, asked, answered } = mixture;
  const { readOutAside } = useLayout();
  const window = useWindowDimensions();
  const copy = useCopy();
  const files = useMixtureFiles(answered, { captioned: true });
  const [drawer, setDrawer] = useState(false);
  const [exporting, setExporting] = useState(false);
  const inputs = inputsWidth[readOutAside ? 'wide' : 'narrow'];
  const request = mixtureRequest(asked, globalThis.location.origin);
  const free = window.height - besidePlot - drawerHeights[drawer ? 'open' : 'closed'];
  return (
    <>
      <Page
        title="Mixture"
        actions={
          <>
            <Button icon="share" label="Copy link" onPress={() => copy('Link', linkTo(state))} />
            <Button icon="download" label="Export" onPress={() => setExporting(true)} />
          </>
        }
      >
        <View style={styles.columns}>
          <View style={{ width: inputs }}>
            <FlaskInputs mixture={mixture} />
          </View>
          <View style={styles.result}>
            <MixtureResult
              mixture={mixture}
              plotHeight={clamp(free, 300, 460)}
              compact={false}
              figure={files.figure}
            />
          </View>
        </View>
      </Page>
      {request && (
        <RequestDrawer
          request={request}
          gives="this mixture"
          open={drawer}
          onToggle={() => setDrawer(!drawer)}
          inputsWidth={inputs}
        />
      )}
      <Dialog title="Export" open={exporting} onClose={() => setExporting(false)}>
        <FileButtons save={files.save} numbers={numbersHeld} />
      </Dialog>
    </>
  );
}

const styles = StyleSheet.create({
  columns: { flexDirection: 'row', alignItems: 'flex-start', gap: space[8] },
  result: { flex: 1, minWidth: 0, maxWidth: resultAtMost },
});
