import { useRouter } from 'expo-router';
import { View } from 'react-native';
import { type BenchCopyRef } from '../../shared/api/bench';
import { SignedIn } from '../account/signed-in';
import { dropEntries, retryRefused } from '../data/outbox';
import { useOutbox } from '../data/outbox-hooks';
import { tell } from '../data/problems';
import { PageHead } from '../shell/page-head';
import { useDropStrays } from '../service-worker/use-kept';
import { Banner } from '../ui/banner';
import { Button } from '../ui/button';
import { Heading } from '../ui/heading';
import { Page, Row, Rule, Section, Stack } from '../ui/layout';
import { Link } from '../ui/link';
import { Progress } from '../ui/progress';
import { EmptyState, ErrorState, LoadingLines } from '../ui/states';
import { Text } from '../ui/text';
import { useCopies } from './bench-queries';

/** One's bench copies. */
export function BenchScreen() {
  return (
    <>
      <SignedIn
        title="Bench"
        what="A bench copy keeps your readings, ticks and notes, and works with no signal."
      >
        {(me) => <Copies personId={me.id} />}
      </SignedIn>
      <Page>
        <Section>
          <Heading level={2}>Bench aids</Heading>
          <Text>
            <Link href="/aids">The shop’s arithmetic</Link>: wood movement, screws, lumber, saw
            set-up, noise, glue. No account and no signal needed.
          </Text>
        </Section>
      </Page>
    </>
  );
}

function Copies({ personId }: { personId: string }) {
  const copies = useCopies();
  useDropStrays(copies.isFetchedAfterMount ? copies.data?.items : undefined);
  const router = useRouter();
  return (
    <>
      <PageHead title="Bench" />
      <Page>
        <Waiting personId={personId} />
        {copies.data ? (
          copies.data.items.length === 0 ? (
            <EmptyState
              title="Nothing on the bench"
              actions={
                <Button kind="primary" label="Find a plan" onPress={() => router.push('/')} />
              }
            >
              Start a bench copy from any plan. It keeps your readings, ticks and notes on this
              device, and works with no signal.
            </EmptyState>
          ) : (
            <View role="list" aria-label="Bench copies">
              {copies.data.items.map((copy) => (
                <Copy key={copy.id} copy={copy} />
              ))}
            </View>
          )
        ) : copies.isError ? (
          <ErrorState
            title="Your bench did not come"
            happened={tell(copies.error).text}
            code={tell(copies.error).code}
            onRetry={() => void copies.refetch()}
          />
        ) : (
          <LoadingLines label="Loading your bench" />
        )}
      </Page>
    </>
  );
}

function Copy({ copy }: { copy: BenchCopyRef }) {
  const router = useRouter();
  const next = Math.min(copy.stepsDone + 1, copy.steps);
  return (
    <View role="listitem">
      <Stack gap={8} style={{ paddingVertical: 16 }}>
        <Heading level={2} note={`rev ${copy.revision.letter}`} ruled={false}>
          {copy.title}
        </Heading>
        <Progress
          label={`${copy.stepsDone} of ${copy.steps} steps done`}
          value={copy.steps ? copy.stepsDone / copy.steps : 0}
        />
        {copy.newerLetter ? (
          <Text tone="ink2">Rev {copy.newerLetter} is out. This copy stays as it is.</Text>
        ) : null}
        <Row>
          <Button
            kind="primary"
            label={
              copy.stepsDone >= copy.steps
                ? `Look at ${copy.title} again`
                : `Go on with step ${next} of ${copy.title}`
            }
            onPress={() => router.push(`/bench/${copy.id}`)}
          >
            {copy.stepsDone >= copy.steps ? 'Look again' : `Go on with step ${next}`}
          </Button>
        </Row>
      </Stack>
      <Rule />
    </View>
  );
}

/** What waits or was refused, on this device. */
function Waiting({ personId }: { personId: string }) {
  const jobs = useOutbox().filter((job) => job.personId === personId);
  const refused = jobs.filter((job) => job.state === 'refused');
  const waiting = jobs.length - refused.length;
  return (
    <>
      {waiting > 0 ? (
        <Banner kind="no-signal">
          {waiting} {waiting === 1 ? 'thing waits' : 'things wait'} on this device and{' '}
          {waiting === 1 ? 'goes' : 'go'} when the signal is back.
        </Banner>
      ) : null}
      {refused.map((job) => (
        <Banner
          key={job.entry.id}
          kind="fails"
          action={{ label: 'Drop it', onPress: () => void dropEntries([job.entry.id]) }}
        >
          A {job.entry.kind} was not taken: {job.reason} It is kept here.
        </Banner>
      ))}
      {refused.length > 0 ? (
        <Button label="Try them again" onPress={() => void retryRefused(personId)} />
      ) : null}
    </>
  );
}
