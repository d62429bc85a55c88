import { useState, type Ref } from 'react';
import type { TextInput } from 'react-native';
import { Button } from '../ui/button';
import { Field } from '../ui/field';

interface PasswordFieldProps {
  readonly value: string;
  readonly onChangeText: (password: string) => void;
  readonly onSubmit: () => void;
  readonly error?: string;
  readonly ref?: Ref<TextInput>;
}

/** The password in use, as dots until it is asked to be shown. */
export function PasswordField(props: PasswordFieldProps) {
  const [shown, setShown] = useState(false);
  return (
    <Field
      {...props}
      label="Password"
      autoComplete="current-password"
      secret={!shown}
      trailing={
        <Button
          kind="quiet"
          hideLabel
          icon={shown ? 'eye-off' : 'eye'}
          label={shown ? 'Hide the password' : 'Show the password'}
          onPress={() => setShown(!shown)}
        />
      }
    />
  );
}
