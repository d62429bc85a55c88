import { useState } from 'react';
import { Pressable, StyleSheet, useWindowDimensions, View } from 'react-native';
import { clamp } from '../chart/geometry';
import { formulaWidth, numeralsWidth } from '../chart/text-width';
import type { Choice } from '../constants/choice';
import { barHeight } from '../shell/bar';
import { Page } from '../shell/page';
import { Button } from '../ui/button';
import { Dialog } from '../ui/dialog';
import { Formula } from '../ui/formula';
import { Icon } from '../ui/icon';
import { Numerals } from '../ui/numerals';
import { Quantity } from '../ui/quantity';
import { space, useTheme } from '../ui/theme';
import { Tabs } from '../ui/tabs';
import { webStyle } from '../ui/web-style';
import { Words } from '../ui/words';
import { Conditions } from './conditions';
import { conditionsText } from './conditions-of';
import { CompareInputs } from './compare-inputs';
import { CurveNotices } from './curve-notices';
import { CurvePlot } from './curve-plot';
import { CurveWarnings } from './curve-warnings';
import type { View as CurvesView } from './curves-state';
import type { DrawnCurve } from './drawn-curve';
import { TotalField } from './layer-boxes';
import { NumbersTable } from './numbers-table';
import { PhControl } from './ph-control';
import { ReadOut } from './read-out';
import { ShareDialog } from './share-dialog';
import { SystemInputs } from './system-inputs';
import type { Curves } from './use-curves';
import { useExports } from './use-exports';

const headAndTabs = 66 + 44;
const dockHeight = 52 + 2 * space[2] + 1;
/** A phone narrower than this shows the read-out in one column. */
const twoColumns = 700;
/** What of the read-out should be in sight under the plot, px. */
const underPlot = 170;
/** Gutters, mark and button beside the line under the title, px. */
const besideSubtitle = 128;

const viewNames: Readonly<Record<CurvesView, string>> = {
  fractions: 'Fractions',
  charge: 'Charge',
  capacity: 'Capacity',
  'lg-c': 'lg c',
};

/** Below 900 px: one column, the pH docked at the thumb. */
export function CurvesPhone({ curves }: { readonly curves: Curves }) {
  const { state, title, drawn, reading, change, move } = curves;
  const { colours } = useTheme();
  const window = useWindowDimensions();
  const exports = useExports(curves, { captioned: false });
  const [open, setOpen] = useState<'system' | 'share'>();
  const close = () => setOpen(undefined);
  const pick = (choice: Choice) => {
    curves.choose(choice);
    close();
  };
  const free = window.height - headAndTabs - dockHeight - barHeight;
  const height = clamp(free - underPlot, 386, 430);
  return (
    <Page
      title={title}
      heading={
        <Pressable
          role="button"
          aria-haspopup="dialog"
          aria-label={`${title}: change the system or its conditions`}
          onPress={() => setOpen('system')}
          style={styles.title}
        >
          <View style={styles.titleWords}>
            <Words kind="title" numberOfLines={1}>
              {title}
            </Words>
          </View>
          <Icon name="chevron-down" />
        </Pressable>
      }
      subtitle={
        drawn && (
          <Numerals size={12} tone="inkSoft" numberOfLines={1}>
            {fitsFormula(drawn, window.width) && (
              <>
                <Formula formula={drawn.formulas[0] ?? ''} />
                {' · '}
              </>
            )}
            <Conditions drawn={drawn} />
          </Numerals>
        )
      }
      actions={
        <Button
          kind="quiet"
          icon="share"
          hideLabel
          label="Share"
          onPress={() => setOpen('share')}
        />
      }
    >
      <View style={styles.column}>
        <View style={styles.edge}>
          <Tabs
            label="What is drawn"
            tabs={[
              { key: 'fractions', label: viewNames.fractions },
              { key: 'charge', label: viewNames.charge },
              { key: 'capacity', label: viewNames.capacity },
              {
                key: 'lg-c',
                label: (
                  <>
                    lg <Quantity of="concentration" />
                  </>
                ),
              },
            ]}
            current={state.view}
            onChange={(view) => change({ view })}
            panel="figure"
          />
        </View>
        <CurveNotices curves={curves} atFields={false} />
        <View id="figure" role="tabpanel" aria-label={viewNames[state.view]} style={styles.edge}>
          <CurvePlot
            curves={curves}
            layers={curves.shown}
            height={height}
            compact
            figure={exports.figure}
          />
        </View>
        {(state.view === 'capacity' || state.view === 'lg-c') && <TotalField {...curves} />}
        <CurveWarnings {...curves} />
        {drawn && reading && (
          <ReadOut
            drawn={drawn}
            reading={reading}
            shown={curves.shown}
            extras={curves.extras}
            total={state.total}
            columns={window.width >= twoColumns}
          />
        )}
        {drawn && <NumbersTable {...curves} drawn={drawn} total={state.total} />}
      </View>
      {reading && drawn && (
        <View
          style={[styles.dock, { backgroundColor: colours.page, borderTopColor: colours.rule }]}
        >
          <View style={styles.column}>
            <PhControl pH={reading.pH} range={drawn.range} onMove={move} />
          </View>
        </View>
      )}
      <Dialog title="System and conditions" open={open === 'system'} onClose={close}>
        <View style={styles.inputs}>
          <SystemInputs {...curves} choose={pick} />
          <CompareInputs {...curves} />
        </View>
      </Dialog>
      <ShareDialog open={open === 'share'} onClose={close} curves={curves} exports={exports} />
    </Page>
  );
}

/** Where the line is too short for both, the conditions stay. */
const fitsFormula = (drawn: DrawnCurve, width: number) =>
  formulaWidth(drawn.formulas[0] ?? '', 12) + numeralsWidth(` · ${conditionsText(drawn)}`, 12) <=
  width - besideSubtitle;

const styles = StyleSheet.create({
  title: { flexDirection: 'row', alignItems: 'center', gap: space[1], minHeight: 28 },
  titleWords: { flexShrink: 1, minWidth: 0 },
  column: { width: '100%', maxWidth: 720, alignSelf: 'center', gap: space[3] },
  inputs: { gap: space[4] },
  edge: { marginHorizontal: -space[4] },
  dock: {
    marginHorizontal: -space[4],
    marginTop: space[4],
    padding: space[2],
    paddingHorizontal: space[4],
    borderTopWidth: 1,
    ...webStyle({
      position: 'sticky',
      bottom: `calc(${barHeight - 1}px + env(safe-area-inset-bottom))`,
      zIndex: 1,
    }),
  },
});
