import { useId, type Ref } from 'react';
import { StyleSheet, View, type TextInput } from 'react-native';
import type { Scope } from '../../shared/scopes';
import { Checkbox } from '../ui/checkbox';
import { Choice } from '../ui/choice';
import { Field } from '../ui/field';
import { FieldMessage } from '../ui/field-message';
import { exactDay } from '../ui/moments';
import { space } from '../ui/theme';
import { useNow } from '../ui/use-now';
import { Words } from '../ui/words';
import { endOf, lifetimes, type DraftFaults, type IssueDraft } from './issue-draft';
import { offeredScopes, scopeWords } from './scope-words';

interface IssueFormProps {
  readonly draft: IssueDraft;
  readonly faults: DraftFaults;
  readonly onChange: (part: Partial<IssueDraft>) => void;
  readonly onSubmit: () => void;
  readonly nameField: Ref<TextInput>;
}

/** What a key is for, what it may do, and how long. */
export function IssueForm({ draft, faults, onChange, onSubmit, nameField }: IssueFormProps) {
  const now = useNow();
  const id = useId();
  const toggle = (scope: Scope, on: boolean) =>
    onChange({
      scopes: offeredScopes.filter((one) => (one === scope ? on : draft.scopes.includes(one))),
    });
  return (
    <View style={styles.form}>
      <Field
        ref={nameField}
        label="Name"
        kind="words"
        value={draft.name}
        onChangeText={(name) => onChange({ name })}
        onSubmit={onSubmit}
        help="The program that will call. It names what stops when the key is revoked."
        error={faults.name}
      />
      <View role="group" aria-labelledby={`${id}-scopes`} aria-describedby={`${id}-message`}>
        <Words kind="label" nativeID={`${id}-scopes`}>
          It may
        </Words>
        <View style={styles.scopes}>
          {offeredScopes.map((scope) => (
            <Checkbox
              key={scope}
              label={scope}
              help={scopeWords[scope]}
              checked={draft.scopes.includes(scope)}
              onChange={(on) => toggle(scope, on)}
            />
          ))}
        </View>
        <FieldMessage
          id={`${id}-message`}
          help="Only what the program needs; never more than your own role."
          error={faults.scopes}
        />
      </View>
      <Choice
        label="It ends after"
        value={draft.lifetime}
        onChange={(lifetime) => onChange({ lifetime })}
        options={lifetimes.map((lifetime) => ({
          value: lifetime,
          label: `${lifetime} days`,
          note: `on ${exactDay(endOf(lifetime, now))}`,
        }))}
        help={`On ${exactDay(endOf(draft.lifetime, now))} it stops by itself.`}
      />
    </View>
  );
}

const styles = StyleSheet.create({
  form: { gap: space[3] },
  scopes: { gap: space[1], marginTop: space[1] },
});
