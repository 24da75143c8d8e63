import { zodResolver } from '@hookform/resolvers/zod';
import { useState } from 'react';
import { Controller, useForm, type Control } from 'react-hook-form';
import { type z } from 'zod';
import { signUpBody } from '../../shared/api/accounts';
import { showProblem } from '../data/form-problem';
import { Button } from '../ui/button';
import { Checkbox } from '../ui/checkbox';
import { Form } from '../ui/form';
import { Link } from '../ui/link';
import { SegmentedControl } from '../ui/radio-group';
import { Text } from '../ui/text';
import { PasswordField, TextField } from '../ui/text-field';
import { type FormTrouble } from './form-frame';

type Typed = Omit<z.input<typeof signUpBody>, 'acceptTerms'> & { acceptTerms: boolean };
export type SignUpValues = z.output<typeof signUpBody>;

export interface SignUpFormProps {
  submit: (values: SignUpValues) => Promise<unknown>;
  onTrouble: (trouble: FormTrouble | null) => void;
}

const fields = ['email', 'password', 'displayName', 'units', 'acceptTerms'] as const;

/** Name, e-mail, password, units, terms. */
export function SignUpForm({ submit, onTrouble }: SignUpFormProps) {
  const form = useForm<Typed, unknown, SignUpValues>({
    resolver: zodResolver(signUpBody) as never,
    defaultValues: { email: '', password: '', displayName: '', units: 'mm', acceptTerms: false },
  });
  const [busy, setBusy] = useState(false);
  const send = form.handleSubmit(async (values) => {
    onTrouble(null);
    setBusy(true);
    try {
      await submit(values);
    } catch (error) {
      onTrouble(showProblem(error, fields, form.setError));
    } finally {
      setBusy(false);
    }
  });
  return (
    <Form label="Make an account" onSubmit={() => void send()}>
      <WhoFields control={form.control} />
      <Controller
        control={form.control}
        name="units"
        render={({ field }) => (
          <SegmentedControl
            label="Your tape reads in"
            options={[
              { value: 'in', label: 'inches' },
              { value: 'mm', label: 'millimetres' },
            ]}
            value={field.value ?? 'mm'}
            onChange={field.onChange}
          />
        )}
      />
      <Controller
        control={form.control}
        name="acceptTerms"
        render={({ field, fieldState }) => (
          <Checkbox
            label="I have read the terms and the safety notice. A check that holds is not a promise of safety."
            value={field.value}
            onChange={field.onChange}
            error={fieldState.error?.message}
          >
            <Text size="note">
              I have read the <Link href="/terms">terms</Link> and the{' '}
              <Link href="/safety">safety notice</Link>. A check that holds is not a promise of
              safety.
            </Text>
          </Checkbox>
        )}
      />
      <Button
        kind="primary"
        label="Make the account"
        submit
        busy={busy}
        busyLabel="Making it"
        wide
      />
    </Form>
  );
}

function WhoFields({ control }: { control: Control<Typed, unknown, SignUpValues> }) {
  return (
    <>
      <Controller
        control={control}
        name="displayName"
        render={({ field, fieldState }) => (
          <TextField
            {...field}
            label="Name others see"
            autoComplete="nickname"
            error={fieldState.error?.message}
          />
        )}
      />
      <Controller
        control={control}
        name="email"
        render={({ field, fieldState }) => (
          <TextField
            {...field}
            label="E-mail"
            type="email"
            autoComplete="email"
            help="We send one letter to confirm it. Nothing else unless you turn it on."
            error={fieldState.error?.message}
          />
        )}
      />
      <Controller
        control={control}
        name="password"
        render={({ field, fieldState }) => (
          <PasswordField
            {...field}
            label="Password"
            autoComplete="new-password"
            help="Twelve characters or more. A phrase is fine."
            error={fieldState.error?.message}
          />
        )}
      />
    </>
  );
}
