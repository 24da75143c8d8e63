import { useLocalSearchParams, useRouter, type Href } from 'expo-router';
import { useState } from 'react';
import { useSignIn } from '../data/me-queries';
import { Heading } from '../ui/heading';
import { Row, Stack } from '../ui/layout';
import { Link } from '../ui/link';
import { Text } from '../ui/text';
import { FormFrame, type FormTrouble } from './form-frame';
import { SignInForm } from './sign-in-form';

/** Only addresses of our own are gone back to. */
const safeNext = (next: string | undefined): string =>
  next !== undefined && /^\/(?!\/)/.test(next) ? next : '/you';

export function SignInScreen() {
  const router = useRouter();
  const { next } = useLocalSearchParams<{ next?: string }>();
  const [trouble, setTrouble] = useState<FormTrouble | null>(null);
  const signIn = useSignIn();
  return (
    <FormFrame title="Sign in" trouble={trouble}>
      <SignInForm
        onTrouble={setTrouble}
        submit={async (values) => {
          await signIn.mutateAsync(values);
          router.replace(safeNext(next) as Href);
        }}
      />
      <Row justify="space-between" wrap>
        <Link href="/reset">Set a new password</Link>
        <Link href="/sign-up">Make an account</Link>
      </Row>
      <Stack gap={12}>
        <Heading level={2}>Without an account</Heading>
        <Text tone="ink2">
          Read every plan and see every figure. A bench copy that keeps your readings needs an
          account.
        </Text>
      </Stack>
    </FormFrame>
  );
}
