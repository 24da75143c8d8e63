import { usePathname } from 'expo-router';
import { useState } from 'react';
import { type LastPerson } from '../data/last-person';
import { useSignIn } from '../data/me-queries';
import { useOutbox } from '../data/outbox-hooks';
import { tell } from '../data/problems';
import { Banner } from '../ui/banner';
import { Button } from '../ui/button';
import { Dialog } from '../ui/dialog';
import { Form } from '../ui/form';
import { Stack } from '../ui/layout';
import { Link } from '../ui/link';
import { Text } from '../ui/text';
import { PasswordField } from '../ui/text-field';

/** What waits for a person on this device, in words; nothing when nothing waits. */
export function useWaitingWords(personId: string | undefined): string {
  const waiting = useOutbox().filter((job) => job.personId === personId).length;
  if (waiting === 0) return '';
  return waiting === 1
    ? 'One bench entry is kept on this device and goes when you have signed in. '
    : `${waiting} bench entries are kept on this device and go when you have signed in. `;
}

/** Over the page somebody was working on when their session turned out to be over: the password, and on. */
export function SessionEnded({ person }: { person: LastPerson }) {
  const [later, setLater] = useState(false);
  return (
    <Dialog open={!later} title="Your session has ended" onClose={() => setLater(true)}>
      <PasswordAgain person={person} />
    </Dialog>
  );
}

function PasswordAgain({ person }: { person: LastPerson }) {
  const [password, setPassword] = useState('');
  const signIn = useSignIn();
  const waiting = useWaitingWords(person.id);
  const path = usePathname();
  return (
    <Stack gap={16}>
      <Text tone="ink2">
        {waiting}What is on the page stays. Type the password of {person.email}.
      </Text>
      {signIn.isError ? <Banner kind="fails">{tell(signIn.error).text}</Banner> : null}
      <Form label="Sign in again" onSubmit={() => signIn.mutate({ email: person.email, password })}>
        <PasswordField
          label="Password"
          name="password"
          value={password}
          onChange={setPassword}
          autoComplete="current-password"
        />
        <Button kind="primary" label="Sign in" submit busy={signIn.isPending} wide />
      </Form>
      <Link href={`/sign-in?next=${encodeURIComponent(path)}`}>Sign in as somebody else</Link>
    </Stack>
  );
}
