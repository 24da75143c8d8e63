import { useLocalSearchParams } from 'expo-router';
import { useState } from 'react';
import { useConfirmEmail } from '../data/me-queries';
import { tell } from '../data/problems';
import { Banner } from '../ui/banner';
import { Button } from '../ui/button';
import { Link } from '../ui/link';
import { Text } from '../ui/text';
import { FormFrame, type FormTrouble } from './form-frame';

/** The letter's link leads here. A press is asked for, so that a mail scanner does not use the link up. */
export function ConfirmScreen() {
  const { token } = useLocalSearchParams<{ token?: string }>();
  const confirm = useConfirmEmail();
  const [trouble, setTrouble] = useState<FormTrouble | null>(null);
  if (confirm.isSuccess) {
    return (
      <FormFrame title="E-mail confirmed" trouble={null}>
        <Banner kind="holds" announce>
          Your e-mail is confirmed. You can talk, upload and take bench copies.
        </Banner>
        <Text>
          <Link href="/sign-in">Sign in</Link>, or go on to <Link href="/">the plans</Link>.
        </Text>
      </FormFrame>
    );
  }
  const press = () => confirm.mutate(token ?? '', { onError: (error) => setTrouble(tell(error)) });
  return (
    <FormFrame title="Confirm your e-mail" trouble={trouble}>
      <Text>Press the button to confirm that this e-mail is yours.</Text>
      <Button
        kind="primary"
        label="Confirm my e-mail"
        onPress={press}
        busy={confirm.isPending}
        busyLabel="Confirming"
        wide
      />
    </FormFrame>
  );
}
