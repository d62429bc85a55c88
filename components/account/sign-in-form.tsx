import { useQueryClient } from '@tanstack/react-query';
import { useEffect, useRef, useState } from 'react';
import { StyleSheet, View, type TextInput } from 'react-native';
import { Button } from '../ui/button';
import { elementOf } from '../ui/element';
import { Failure } from '../ui/failure';
import { Field } from '../ui/field';
import { space } from '../ui/theme';
import { useLayout } from '../ui/use-layout';
import { PasswordField } from './password-field';
import { useSignIn } from './session-queries';

/** E-mail address and password. What is wrong stands above them, where the focus then goes. */
export function SignInForm({ knownEmail = '' }: { readonly knownEmail?: string }) {
  const { rail } = useLayout();
  const queryClient = useQueryClient();
  const signIn = useSignIn();
  const [email, setEmail] = useState(knownEmail);
  const [password, setPassword] = useState('');
  const [missing, setMissing] = useState(false);
  const emailField = useRef<TextInput>(null);
  const passwordField = useRef<TextInput>(null);
  const failure = useRef<View>(null);
  const { error, isPending, isSuccess } = signIn;
  const busy = isPending || isSuccess;

  // With a keyboard at hand the first thing to do is to type; on a phone it would hide the page.
  useEffect(() => {
    if (rail) (knownEmail ? passwordField : emailField).current?.focus();
  }, [rail, knownEmail]);
  useEffect(() => {
    if (error) elementOf(failure.current)?.focus();
  }, [error]);

  const submit = () => {
    const empty = email.trim() === '' ? emailField : password === '' ? passwordField : undefined;
    setMissing(empty !== undefined);
    if (empty) return empty.current?.focus();
    // Asked of the cache: a second Enter may come before this form is drawn again.
    if (busy || queryClient.isMutating({ mutationKey: ['sign-in'] }) > 0) return;
    signIn.mutate({ email: email.trim(), password });
  };

  return (
    <View role="form" aria-label="Sign in" style={styles.form}>
      {error && <Failure ref={failure} error={error} />}
      <Field
        ref={emailField}
        label="E-mail"
        kind="words"
        value={email}
        onChangeText={setEmail}
        onSubmit={submit}
        error={missing && email.trim() === '' ? 'Write your e-mail address.' : undefined}
        inputMode="email"
        autoComplete="username"
      />
      <PasswordField
        ref={passwordField}
        value={password}
        onChangeText={setPassword}
        onSubmit={submit}
        error={missing && password === '' ? 'Write your password.' : undefined}
      />
      <Button
        kind="primary"
        size="main"
        label={busy ? 'Signing in …' : 'Sign in'}
        onPress={submit}
      />
    </View>
  );
}

const styles = StyleSheet.create({
  form: { gap: space[3] },
});
