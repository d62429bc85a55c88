import { useState } from 'react';
import { StyleSheet, useWindowDimensions, View } from 'react-native';
import { clamp } from '../chart/geometry';
import { Page } from '../shell/page';
import { Button } from '../ui/button';
import { Dialog } from '../ui/dialog';
import { Formula } from '../ui/formula';
import { FileButtons } from '../leaving/file-buttons';
import { drawerHeights, RequestDrawer } from '../request/request-drawer';
import { space, useTheme } from '../ui/theme';
import { useLayout } from '../ui/use-layout';
import { webStyle } from '../ui/web-style';
import { Words } from '../ui/words';
import { CompareInputs } from './compare-inputs';
import { CurveNotices } from './curve-notices';
import { CurvePlot } from './curve-plot';
import { LayerBoxes } from './layer-boxes';
import { NumbersTable } from './numbers-table';
import { SidePanel } from './side-panel';
import { SystemInputs } from './system-inputs';
import { linkTo } from './use-address';
import { useCopy } from '../ui/use-copy';
import type { Curves } from './use-curves';
import { numbersHeld, useExports } from './use-exports';
import { useScreenRequest } from './use-screen-request';

const headHeight = 76;
const inputsWidth = { narrow: 232, wide: 224 } as const;
const asideWidth = 256;
/** What of the read-out under the plot should be in sight, px. */
const underPlot = 100;
const plotAtMost = 960;

/** From 900 px: inputs left, plot right of them, read-out under it or, from 1200 px, at its right. */
export function CurvesWide({ curves }: { readonly curves: Curves }) {
  const { state, title, drawn } = curves;
  const { readOutAside } = useLayout();
  const { colours } = useTheme();
  const window = useWindowDimensions();
  const copy = useCopy();
  const exports = useExports(curves, { captioned: true });
  const screenRequest = useScreenRequest(curves);
  const [drawer, setDrawer] = useState(false);
  const [exporting, setExporting] = useState(false);
  const inputs = inputsWidth[readOutAside ? 'wide' : 'narrow'];
  const free = window.height - headHeight - drawerHeights[drawer ? 'open' : 'closed'];
  const height = readOutAside
    ? clamp(free - space[2], 400, 900)
    : clamp(free - underPlot, 360, 620);
  const numbers = drawn && <NumbersTable {...curves} drawn={drawn} total={state.total} />;
  return (
    <>
      <Page
        title={title}
        subtitle={
          drawn && (
            <Words kind="section" tone="inkSoft">
              <Formula formula={drawn.formulas[0] ?? ''} />
            </Words>
          )
        }
        actions={
          <>
            <Button icon="share" label="Copy link" onPress={() => copy('Link', linkTo(state))} />
            <Button icon="download" label="Export" onPress={() => setExporting(true)} />
          </>
        }
      >
        <View style={styles.columns}>
          <View style={[styles.inputs, { width: inputs }]}>
            <SystemInputs {...curves} />
            <LayerBoxes {...curves} />
            <CompareInputs {...curves} />
          </View>
          <View style={[styles.plot, readOutAside && styles.plotStays]}>
            <CurveNotices curves={curves} atFields />
            <CurvePlot
              curves={curves}
              layers={curves.shown}
              height={height}
              compact={false}
              figure={exports.figure}
            />
            {!readOutAside && <SidePanel curves={curves} columns />}
            {!readOutAside && numbers}
          </View>
          {readOutAside && (
            <View style={[styles.aside, { borderLeftColor: colours.rule }]}>
              <SidePanel curves={curves} columns={false} />
              {numbers}
            </View>
          )}
        </View>
      </Page>
      <RequestDrawer
        {...screenRequest}
        open={drawer}
        onToggle={() => setDrawer(!drawer)}
        inputsWidth={inputs}
      />
      <Dialog title="Export" open={exporting} onClose={() => setExporting(false)}>
        <FileButtons save={exports.save} numbers={numbersHeld} />
      </Dialog>
    </>
  );
}

const styles = StyleSheet.create({
  columns: { flexDirection: 'row', alignItems: 'flex-start' },
  inputs: { gap: space[4], marginRight: space[5] },
  plot: { flex: 1, minWidth: 0, maxWidth: plotAtMost, gap: space[4] },
  plotStays: webStyle({ position: 'sticky', top: 0 }),
  aside: {
    width: asideWidth + space[5] + 1,
    marginLeft: space[3],
    paddingLeft: space[5],
    borderLeftWidth: 1,
    gap: space[4],
  },
});
