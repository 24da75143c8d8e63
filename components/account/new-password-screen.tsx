import { useLocalSearchParams, useRouter } from 'expo-router';
import { useState } from 'react';
import { limits } from '../../shared/api/limits';
import { useSetPassword } from '../data/me-queries';
import { ApiProblem, tell } from '../data/problems';
import { Button } from '../ui/button';
import { Form } from '../ui/form';
import { toast } from '../ui/announcer';
import { Text } from '../ui/text';
import { PasswordField } from '../ui/text-field';
import { FormFrame, type FormTrouble } from './form-frame';

export function NewPasswordScreen() {
  const { token } = useLocalSearchParams<{ token?: string }>();
  const router = useRouter();
  const set = useSetPassword();
  const [password, setPassword] = useState('');
  const [fault, setFault] = useState<string | undefined>();
  const [trouble, setTrouble] = useState<FormTrouble | null>(null);
  const send = () => {
    setTrouble(null);
    setFault(
      password.length < limits.passwordMin
        ? 'Twelve characters or more. A phrase is fine.'
        : undefined,
    );
    if (password.length < limits.passwordMin) return;
    set.mutate(
      { token: token ?? '', password },
      {
        onSuccess: () => {
          toast({ text: 'The new password is set. Sign in with it.' });
          router.replace('/sign-in');
        },
        onError: (error) => {
          const issue =
            error instanceof ApiProblem
              ? error.issues.find((i) => i.path[0] === 'password')
              : undefined;
          if (issue) setFault(issue.message);
          else setTrouble(tell(error));
        },
      },
    );
  };
  return (
    <FormFrame title="A new password" back="/sign-in" trouble={trouble}>
      <Form label="A new password" onSubmit={send}>
        <Text>It ends every session you have open.</Text>
        <PasswordField
          label="New password"
          autoComplete="new-password"
          help="Twelve characters or more. A phrase is fine."
          value={password}
          onChange={setPassword}
          error={fault}
        />
        <Button
          kind="primary"
          label="Set the password"
          submit
          busy={set.isPending}
          busyLabel="Setting it"
          wide
        />
      </Form>
    </FormFrame>
  );
}
