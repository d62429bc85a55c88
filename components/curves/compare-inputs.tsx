import { useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { SystemCombobox } from '../handbook/system-combobox';
import { systemTitle } from '../handbook/system-title';
import { Button } from '../ui/button';
import { Disclosure } from '../ui/disclosure';
import { space } from '../ui/theme';
import { Words } from '../ui/words';
import { ConditionFields } from './condition-fields';
import type { CurveAsked } from './curve-asked';
import { changedConditions } from './curve-conditions';
import { besideAtMost, nextBeside } from './curves-state';
import type { Curves } from './use-curves';

/** The curves that are compared with: which, and under which conditions. */
export function CompareInputs({ state, others, drawn, extras, change }: Curves) {
  const { beside } = state;
  const setAt = (index: number, asked: CurveAsked) => change({ beside: beside.with(index, asked) });
  const full = beside.length >= besideAtMost;
  // One that was just added is there to be changed.
  const [added, setAdded] = useState<number>();
  return (
    <View style={styles.list}>
      <Words kind="label">Compare</Words>
      {beside.map((asked, index) => {
        const other = others.find((one) => one.asked === asked);
        const name = extras.beside.find((one) => one.drawn === other?.drawn)?.name;
        const known = other?.drawn?.system.name;
        const title = name ?? `Curve ${index + 2}`;
        return (
          <View key={index} role="group" aria-label={`Compared with ${title}`}>
            <View style={styles.head}>
              <View style={styles.title}>
                <Disclosure label={title} startsOpen={index === added}>
                  <View style={styles.fields}>
                    <SystemCombobox
                      label="System"
                      value={known === undefined ? '' : systemTitle(known)}
                      onPick={(id) => setAt(index, { ...asked, choice: { kind: 'stored', id } })}
                      onTypeOwn={() =>
                        setAt(index, {
                          ...asked,
                          choice: drawn ? { kind: 'typed', system: drawn.system } : state.choice,
                        })
                      }
                    />
                    <ConditionFields
                      conditions={asked.conditions}
                      onChange={(part) =>
                        setAt(index, {
                          ...asked,
                          conditions: changedConditions(asked.conditions, part),
                        })
                      }
                      error={other?.error ?? null}
                    />
                  </View>
                </Disclosure>
              </View>
              <Button
                kind="quiet"
                icon="close"
                hideLabel
                label={`Remove ${title}`}
                onPress={() => change({ beside: beside.filter((_, i) => i !== index) })}
              />
            </View>
          </View>
        );
      })}
      <View style={styles.add}>
        <Button
          icon="plus"
          label="Compare with…"
          disabled={full}
          why={`At most ${besideAtMost + 1} curves lie over each other here.`}
          onPress={() => {
            setAdded(beside.length);
            change({ beside: [...beside, nextBeside(state)] });
          }}
        />
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  list: { gap: space[2] },
  head: { flexDirection: 'row', alignItems: 'flex-start', gap: space[1] },
  title: { flex: 1, minWidth: 0 },
  fields: { gap: space[2] },
  add: { alignItems: 'flex-start' },
});
