import { useState } from 'react';
import { useAskReset } from '../data/me-queries';
import { ApiProblem, tell } from '../data/problems';
import { Banner } from '../ui/banner';
import { Button } from '../ui/button';
import { Form } from '../ui/form';
import { Text } from '../ui/text';
import { TextField } from '../ui/text-field';
import { FormFrame, type FormTrouble } from './form-frame';

export function ResetScreen() {
  const ask = useAskReset();
  const [email, setEmail] = useState('');
  const [fault, setFault] = useState<string | undefined>();
  const [trouble, setTrouble] = useState<FormTrouble | null>(null);
  const send = () => {
    setFault(undefined);
    setTrouble(null);
    ask.mutate(email.trim(), {
      onError: (error) => {
        const issue =
          error instanceof ApiProblem ? error.issues.find((i) => i.path[0] === 'email') : undefined;
        if (issue) setFault(issue.message);
        else setTrouble(tell(error));
      },
    });
  };
  return (
    <FormFrame title="Set a new password" back="/sign-in" trouble={trouble}>
      {ask.isSuccess ? (
        <Banner kind="holds" announce>
          If we know that address, a letter is on its way. Its link works for one hour.
        </Banner>
      ) : (
        <Form label="Set a new password" onSubmit={send}>
          <Text>We send a letter with a link that lets you set a new one.</Text>
          <TextField
            label="E-mail"
            type="email"
            autoComplete="email"
            value={email}
            onChange={setEmail}
            error={fault}
          />
          <Button
            kind="primary"
            label="Send the letter"
            submit
            busy={ask.isPending}
            busyLabel="Sending"
            wide
          />
        </Form>
      )}
    </FormFrame>
  );
}
