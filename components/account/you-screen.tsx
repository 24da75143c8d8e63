import { useState } from 'react';
import { useRouter } from 'expo-router';
import { type Me } from '../../shared/api/accounts';
import { useMe, useResendConfirmation, useUpdateProfile } from '../data/me-queries';
import { usePreferences } from '../data/preferences';
import { showProblem } from '../data/form-problem';
import { tell } from '../data/problems';
import { PageHead } from '../shell/page-head';
import { ThemeSetting } from '../shell/theme-choice';
import { toast } from '../ui/announcer';
import { Banner } from '../ui/banner';
import { Button } from '../ui/button';
import { Form } from '../ui/form';
import { Heading } from '../ui/heading';
import { Page, Row, Section, Stack } from '../ui/layout';
import { Link } from '../ui/link';
import { SegmentedControl } from '../ui/radio-group';
import { LoadingLines } from '../ui/states';
import { Text } from '../ui/text';
import { TextField } from '../ui/text-field';
import { useForm, Controller } from 'react-hook-form';
import { CreatorSection } from './creator-section';
import { Leave } from './leave';

/** One's own page; signed out it still holds the settings of this browser. */
export function YouScreen() {
  const { me, known, failed } = useMe();
  return (
    <>
      <PageHead title="You" sub={me ? me.email : undefined} />
      <Page width="form">
        {me ? (
          <Account me={me} />
        ) : known || failed ? (
          <Nobody />
        ) : (
          <LoadingLines label="Loading your page" />
        )}
        <Settings signedIn={me !== null} />
        <Section>
          <Heading level={2}>The small print</Heading>
          <Row gap={16} wrap>
            <Link href="/safety">Safety notice</Link>
            <Link href="/rules">Rules of the place</Link>
            <Link href="/terms">Terms</Link>
          </Row>
        </Section>
        {me ? <Leave me={me} /> : null}
      </Page>
    </>
  );
}

function Nobody() {
  const router = useRouter();
  return (
    <Stack gap={12}>
      <Text>Nobody is signed in on this device.</Text>
      <Row gap={12} wrap>
        <Button kind="primary" label="Sign in" onPress={() => router.push('/sign-in')} />
        <Button label="Make an account" onPress={() => router.push('/sign-up')} />
      </Row>
    </Stack>
  );
}

function Account({ me }: { me: Me }) {
  const resend = useResendConfirmation();
  return (
    <Stack gap={24}>
      {me.emailConfirmed ? null : (
        <Banner
          kind="risk"
          action={{
            label: resend.isSuccess ? 'Sent' : 'Send the letter again',
            onPress: () =>
              resend.mutate(undefined, { onError: (error) => toast({ text: tell(error).text }) }),
          }}
        >
          Your e-mail is not confirmed yet. Talking and uploading wait for it.
        </Banner>
      )}
      <ProfileForm me={me} />
      {me.abilities.moderate ? (
        <Row gap={16} wrap>
          <Link href="/cases">Cases</Link>
          {me.abilities.administer ? <Link href="/you/people">People and roles</Link> : null}
        </Row>
      ) : null}
      <Link href="/you/sessions">Where you are signed in</Link>
      <CreatorSection me={me} />
    </Stack>
  );
}

function ProfileForm({ me }: { me: Me }) {
  const update = useUpdateProfile();
  const form = useForm({
    defaultValues: { displayName: me.displayName, shopName: me.shopName ?? '' },
  });
  const [trouble, setTrouble] = useState<string | null>(null);
  const send = form.handleSubmit(async (values) => {
    setTrouble(null);
    try {
      await update.mutateAsync({
        displayName: values.displayName,
        shopName: values.shopName.trim() || null,
      });
      toast({ text: 'Kept.' });
    } catch (error) {
      setTrouble(showProblem(error, ['displayName', 'shopName'], form.setError)?.text ?? null);
    }
  });
  return (
    <Form label="Your name" onSubmit={() => void send()}>
      {trouble ? <Banner kind="fails">{trouble}</Banner> : null}
      <Controller
        control={form.control}
        name="displayName"
        render={({ field, fieldState }) => (
          <TextField {...field} label="Name others see" error={fieldState.error?.message} />
        )}
      />
      <Controller
        control={form.control}
        name="shopName"
        render={({ field, fieldState }) => (
          <TextField
            {...field}
            label="Name of your shop"
            optional
            error={fieldState.error?.message}
          />
        )}
      />
      <Button label="Keep" submit busy={update.isPending} />
    </Form>
  );
}

function Settings({ signedIn }: { signedIn: boolean }) {
  const [preferences, change] = usePreferences(signedIn);
  return (
    <Section gap={16}>
      <Heading level={2}>Figures and light</Heading>
      <SegmentedControl
        label="Units"
        options={[
          { value: 'mm', label: 'millimetres' },
          { value: 'in', label: 'inches' },
        ]}
        value={preferences.units}
        onChange={(units) => change({ units })}
      />
      <SegmentedControl
        label="Inches to the nearest"
        options={[
          { value: '16', label: '1/16' },
          { value: '32', label: '1/32' },
          { value: '64', label: '1/64' },
        ]}
        value={String(preferences.inchGrid) as '16' | '32' | '64'}
        onChange={(grid) => change({ inchGrid: Number(grid) as 16 | 32 | 64 })}
      />
      <SegmentedControl
        label="Shop words"
        options={[
          { value: 'us', label: 'American' },
          { value: 'uk', label: 'British' },
        ]}
        value={preferences.terms}
        onChange={(terms) => change({ terms })}
      />
      <ThemeSetting />
    </Section>
  );
}
