import { useState } from 'react';
import { type Me } from '../../shared/api/accounts';
import { useBecomeCreator } from '../data/me-queries';
import { tell } from '../data/problems';
import { Banner } from '../ui/banner';
import { Button } from '../ui/button';
import { Checkbox } from '../ui/checkbox';
import { Heading } from '../ui/heading';
import { Stack } from '../ui/layout';
import { Link } from '../ui/link';
import { Text } from '../ui/text';

/** What a creator agrees to, in plain words. */
export const publishingRules = [
  'Publish what is yours. Say whose method you build on.',
  'Say what a link to something on sale earns you.',
  'Write the caution next to the action. Never tell people to leave a guard off where it can stay on.',
  'When you learn that a plan is wrong, correct it: those who built from it hear of it.',
] as const;

/** A confirmed viewer becomes a creator by accepting the publishing rules. */
export function CreatorSection({ me }: { me: Me }) {
  const become = useBecomeCreator();
  const [accepted, setAccepted] = useState(false);
  const [fault, setFault] = useState<string | undefined>();
  if (me.roles.includes('creator')) {
    return (
      <Text>
        You may publish. <Link href="/drafting">Go to drafting</Link>
      </Text>
    );
  }
  if (!me.emailConfirmed) return null;
  const press = () => {
    if (!accepted) return setFault('Please read and accept the publishing rules.');
    become.mutate();
  };
  return (
    <Stack gap={12}>
      <Heading level={2}>Publish plans of your own</Heading>
      {become.isError ? <Banner kind="fails">{tell(become.error).text}</Banner> : null}
      {publishingRules.map((rule) => (
        <Text key={rule}>{rule}</Text>
      ))}
      <Checkbox
        label="I accept these publishing rules"
        value={accepted}
        onChange={setAccepted}
        error={fault}
      />
      <Button label="Become a creator" onPress={press} busy={become.isPending} />
    </Stack>
  );
}
