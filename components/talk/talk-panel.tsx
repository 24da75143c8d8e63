import { useState } from 'react';
import { type Thread } from '../../shared/api/talk';
import { type PlanDocument } from '../../shared/plan/document';
import { useMe } from '../data/me-queries';
import { tell } from '../data/problems';
import { Button } from '../ui/button';
import { Row, Stack } from '../ui/layout';
import { Link } from '../ui/link';
import { EmptyState, ErrorState, LoadingLines } from '../ui/states';
import { Tag } from '../ui/tag';
import { Text } from '../ui/text';
import { CommentForm, type AnchorChoice } from './comment-form';
import { ReportDialog, type ReportSubject } from './report-dialog';
import { ThreadView } from './thread-view';
import { usePostComment, useTalk, type TalkFilter } from './talk-queries';

export interface TalkPanelProps {
  planId: string;
  document: PlanDocument;
  /** Show only what hangs on this step, and offer it first. */
  stepId?: string;
}

/** Where a comment can hang: the plan as a whole, or one of its steps. */
export function anchorsOf(document: PlanDocument): AnchorChoice[] {
  return [
    { value: 'plan', label: 'the plan as a whole', anchor: { on: 'plan' } },
    ...document.steps.map((step, i) => ({
      value: step.id,
      label: `step ${i + 1}: ${step.title}`,
      anchor: { on: 'step' as const, elementId: step.id },
    })),
  ];
}

/** Words for a thread's anchor. */
export function whereOf(document: PlanDocument, thread: Thread): string {
  const { on, elementId } = thread.anchor;
  if (on === 'step') {
    const at = document.steps.findIndex((s) => s.id === elementId);
    return at < 0 ? 'a step of an earlier revision' : `step ${at + 1}`;
  }
  if (on === 'part')
    return `part ${document.parts.find((p) => p.id === elementId)?.mark ?? 'of an earlier revision'}`;
  if (on === 'dimension')
    return document.dimensions.find((d) => d.id === elementId)?.name ?? 'a dimension';
  return 'the plan';
}

const filters: { label: string; filter: TalkFilter }[] = [
  { label: 'all', filter: {} },
  { label: 'critiques', filter: { kind: 'critique' } },
  { label: 'questions', filter: { kind: 'question' } },
  { label: 'open questions', filter: { kind: 'question', open: 'true' } },
];

/** Critiques and questions under a plan, with the form to add one. */
export function TalkPanel({ planId, document, stepId }: TalkPanelProps) {
  const { me } = useMe();
  const [chosen, setChosen] = useState(0);
  const [writing, setWriting] = useState(false);
  const [reported, setReported] = useState<ReportSubject | null>(null);
  const talk = useTalk(planId, {
    ...filters[chosen]!.filter,
    ...(stepId ? { elementId: stepId } : {}),
  });
  const post = usePostComment(planId);
  const threads = talk.data?.pages.flatMap((p) => p.items) ?? [];
  const canTalk = me?.abilities.talk ?? false;
  return (
    <Stack gap={16}>
      <Row gap={8} wrap>
        {filters.map((f, i) => (
          <Tag
            key={f.label}
            label={f.label}
            kind={i === chosen ? 'on' : 'plain'}
            onPress={() => setChosen(i)}
          />
        ))}
      </Row>
      {writing ? (
        <CommentForm
          anchors={anchorsOf(document)}
          at={stepId ?? 'plan'}
          submit={(body) => post.mutateAsync(body)}
          onDone={() => setWriting(false)}
        />
      ) : canTalk ? (
        <Button label="Critique or ask" icon="critique" onPress={() => setWriting(true)} />
      ) : (
        <Text tone="ink2">
          {me ? 'Confirm your e-mail to talk here.' : <Link href="/sign-in">Sign in</Link>}
          {me ? null : ' to critique or ask.'}
        </Text>
      )}
      {talk.isError ? (
        <ErrorState
          title="The talk did not come"
          happened={tell(talk.error).text}
          code={tell(talk.error).code}
          onRetry={() => void talk.refetch()}
          level={3}
        />
      ) : !talk.data ? (
        <LoadingLines label="Loading the talk" />
      ) : threads.length === 0 ? (
        <EmptyState title="Nothing said here" level={3}>
          A critique says what to keep or change, and why. A question wants an answer.
        </EmptyState>
      ) : (
        threads.map((thread) => (
          <ThreadView
            key={thread.id}
            thread={thread}
            where={whereOf(document, thread)}
            canTalk={canTalk}
            onReport={setReported}
          />
        ))
      )}
      {talk.hasNextPage ? (
        <Button
          label="Show more"
          onPress={() => void talk.fetchNextPage()}
          busy={talk.isFetchingNextPage}
        />
      ) : null}
      <ReportDialog subject={reported} onClose={() => setReported(null)} />
    </Stack>
  );
}
