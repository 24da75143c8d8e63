import { useRouter } from 'expo-router';
import { useRef, useState } from 'react';
import { View } from 'react-native';
import { v7 as uuid } from 'uuid';
import { type DraftCard } from '../../shared/api/plans';
import { SignedIn } from '../account/signed-in';
import { tell } from '../data/problems';
import { PageHead } from '../shell/page-head';
import { Banner } from '../ui/banner';
import { Button } from '../ui/button';
import { Form } from '../ui/form';
import { Heading } from '../ui/heading';
import { Page, Row, Rule, Stack } from '../ui/layout';
import { Link } from '../ui/link';
import { SegmentedControl } from '../ui/radio-group';
import { EmptyState, ErrorState, LoadingLines } from '../ui/states';
import { Text } from '../ui/text';
import { TextField } from '../ui/text-field';
import { useCreateDraft, useDrafts } from './drafting-queries';
import { BringPlanFile } from './plan-file';

/** One's own plans. */
export function DraftingScreen() {
  return (
    <SignedIn title="Drafting" what="Makers work on their plans here.">
      {(me) => (me.abilities.draft ? <Plans /> : <NotYet />)}
    </SignedIn>
  );
}

function NotYet() {
  const router = useRouter();
  return (
    <>
      <PageHead title="Drafting" />
      <Page>
        <EmptyState
          title="Publish plans of your own"
          actions={
            <Button kind="primary" label="Become a creator" onPress={() => router.push('/you')} />
          }
        >
          Bring a clip and its captions; they become timed steps, parts and dimensions. Accept the
          publishing rules first.
        </EmptyState>
      </Page>
    </>
  );
}

function Plans() {
  const drafts = useDrafts();
  return (
    <>
      <PageHead title="Drafting" />
      <Page>
        <Begin />
        <BringPlanFile />
        {drafts.data ? (
          drafts.data.items.length === 0 ? (
            <EmptyState title="No plan yet">
              Begin one above. It stays yours until you publish it.
            </EmptyState>
          ) : (
            <View role="list" aria-label="Your plans">
              {drafts.data.items.map((card) => (
                <PlanLine key={card.id} card={card} />
              ))}
            </View>
          )
        ) : drafts.isError ? (
          <ErrorState
            title="Your plans did not come"
            happened={tell(drafts.error).text}
            code={tell(drafts.error).code}
            onRetry={() => void drafts.refetch()}
          />
        ) : (
          <LoadingLines label="Loading your plans" />
        )}
      </Page>
    </>
  );
}

function PlanLine({ card }: { card: DraftCard }) {
  return (
    <View role="listitem">
      <Stack gap={4} style={{ paddingVertical: 12 }}>
        <Heading level={2} ruled={false}>
          <Link href={`/drafting/${card.id}`}>{card.title}</Link>
        </Heading>
        <Text size="note" tone="ink2">
          {card.state}
          {card.letter ? `, rev ${card.letter}` : ''}, {card.steps} steps, changed{' '}
          {new Date(card.updatedAt).toLocaleDateString()}
        </Text>
      </Stack>
      <Rule />
    </View>
  );
}

function Begin() {
  const router = useRouter();
  const create = useCreateDraft();
  // One id for one plan, however often it has to be sent.
  const id = useRef(uuid());
  const [title, setTitle] = useState('');
  const [units, setUnits] = useState<'mm' | 'in'>('mm');
  const [fault, setFault] = useState<string | undefined>();
  const begin = () => {
    setFault(title.trim() === '' ? 'Give the plan a title.' : undefined);
    if (title.trim() === '') return;
    create.mutate(
      { id: id.current, title: title.trim(), units },
      { onSuccess: (draft) => router.push(`/drafting/${draft.id}`) },
    );
  };
  return (
    <Form label="Begin a plan" onSubmit={begin}>
      {create.isError ? <Banner kind="fails">{tell(create.error).text}</Banner> : null}
      <TextField label="Title of a new plan" value={title} onChange={setTitle} error={fault} />
      <SegmentedControl
        label="Its figures are in"
        options={[
          { value: 'mm', label: 'millimetres' },
          { value: 'in', label: 'inches' },
        ]}
        value={units}
        onChange={setUnits}
      />
      <Row>
        <Button kind="primary" label="Begin the plan" submit busy={create.isPending} />
      </Row>
    </Form>
  );
}
