import { useState } from 'react';
import { useSignUp } from '../data/me-queries';
import { Banner } from '../ui/banner';
import { Link } from '../ui/link';
import { Text } from '../ui/text';
import { FormFrame, type FormTrouble } from './form-frame';
import { SignUpForm } from './sign-up-form';

export function SignUpScreen() {
  const [trouble, setTrouble] = useState<FormTrouble | null>(null);
  const [sentTo, setSentTo] = useState<string | null>(null);
  const signUp = useSignUp();
  if (sentTo !== null) {
    return (
      <FormFrame title="Look for our letter" back="/sign-in" trouble={null}>
        <Banner kind="holds" announce>
          We wrote to {sentTo}. Open the letter and follow its link; then sign in.
        </Banner>
        <Text tone="ink2">
          Nothing came? Look in the spam folder, or <Link href="/sign-in">sign in</Link> and have it
          sent again.
        </Text>
      </FormFrame>
    );
  }
  return (
    <FormFrame title="Make an account" back="/sign-in" trouble={trouble}>
      <SignUpForm
        onTrouble={setTrouble}
        submit={async (values) => {
          await signUp.mutateAsync(values);
          setSentTo(values.email);
        }}
      />
      <Text tone="ink2">
        You have one? <Link href="/sign-in">Sign in</Link>
      </Text>
    </FormFrame>
  );
}
