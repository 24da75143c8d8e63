import { zodResolver } from '@hookform/resolvers/zod';
import { useEffect, useState } from 'react';
import { Controller, useForm } from 'react-hook-form';
import { type z } from 'zod';
import { signInBody } from '../../shared/api/accounts';
import { lastPerson } from '../data/last-person';
import { showProblem } from '../data/form-problem';
import { Button } from '../ui/button';
import { Form } from '../ui/form';
import { PasswordField, TextField } from '../ui/text-field';
import { type FormTrouble } from './form-frame';

export type SignInValues = z.infer<typeof signInBody>;

export interface SignInFormProps {
  /** Sends it; rejects with the server's problem. */
  submit: (values: SignInValues) => Promise<unknown>;
  onTrouble: (trouble: FormTrouble | null) => void;
}

/** E-mail and password. What was typed stays when it does not work. */
export function SignInForm({ submit, onTrouble }: SignInFormProps) {
  const form = useForm<SignInValues>({
    resolver: zodResolver(signInBody),
    defaultValues: { email: '', password: '' },
  });
  const [busy, setBusy] = useState(false);
  const { setValue, getValues } = form;
  useEffect(() => {
    // Only then: the page was pre-rendered without it.
    const last = lastPerson();
    if (last && getValues('email') === '') setValue('email', last.email);
  }, [setValue, getValues]);
  const send = form.handleSubmit(async (values) => {
    onTrouble(null);
    setBusy(true);
    try {
      await submit(values);
    } catch (error) {
      onTrouble(showProblem(error, ['email', 'password'], form.setError));
    } finally {
      setBusy(false);
    }
  });
  return (
    <Form label="Sign in" onSubmit={() => void send()}>
      <Controller
        control={form.control}
        name="email"
        render={({ field, fieldState }) => (
          <TextField
            {...field}
            label="E-mail"
            type="email"
            autoComplete="email"
            error={fieldState.error?.message}
          />
        )}
      />
      <Controller
        control={form.control}
        name="password"
        render={({ field, fieldState }) => (
          <PasswordField
            {...field}
            label="Password"
            autoComplete="current-password"
            error={fieldState.error?.message}
          />
        )}
      />
      <Button kind="primary" label="Sign in" submit busy={busy} busyLabel="Signing in" wide />
    </Form>
  );
}
