import { useRouter } from 'expo-router';
import { useMemo, useState } from 'react';
import { limits } from '../../shared/api/limits';
import { type Draft } from '../../shared/api/plans';
import { checkSheet, type SheetRow } from '../../shared/plan/sheet';
import { tell } from '../data/problems';
import { toast } from '../ui/announcer';
import { Banner } from '../ui/banner';
import { Button } from '../ui/button';
import { Heading } from '../ui/heading';
import { Row, Rule, Section, Stack } from '../ui/layout';
import { Link } from '../ui/link';
import { Text } from '../ui/text';
import { TextArea } from '../ui/text-field';
import { Verdict, verdictKind } from '../ui/verdict';
import { useMovePlan, usePublish } from './drafting-queries';
import { SavePlanFile } from './plan-file';
import { type DraftEditor } from './use-draft-editor';

/** The shortest reason for publishing over a failing must, in characters. */
const shortestReason = limits.reasonMin;
const keyOf = (row: SheetRow) => `${row.rule}/${row.place.elementId ?? ''}`;

/** The check sheet, publishing, and what was published before. */
export function PublishPane({ draft, editor }: { draft: Draft; editor: DraftEditor }) {
  const router = useRouter();
  const publish = usePublish(draft.id);
  const sheet = useMemo(() => checkSheet(editor.document, editor.model, 'publish'), [editor]);
  const [reasons, setReasons] = useState<Record<string, string>>({});
  const [note, setNote] = useState('');
  const [unsaved, setUnsaved] = useState(false);
  const failing = sheet.rows.filter((row) => row.verdict === 'fails');
  const [asked, setAsked] = useState(false);
  const short = (row: SheetRow) =>
    row.verdict === 'fails' && (reasons[keyOf(row)] ?? '').trim().length < shortestReason;
  const send = async () => {
    setUnsaved(false);
    setAsked(true);
    if (failing.some(short)) return;
    if (!(await editor.saveNow())) return setUnsaved(true);
    publish.mutate(
      {
        version: editor.version(),
        note,
        overrides: failing.map((row) => ({
          rule: row.rule,
          elementId: row.place.elementId,
          reason: reasons[keyOf(row)] ?? '',
        })),
      },
      { onSuccess: ({ slug }) => router.push(`/plans/${slug}`) },
    );
  };
  return (
    <Stack gap={24} style={{ maxWidth: 720 }}>
      <Section>
        <Heading level={2} note={`${sheet.quiet} rules hold`}>
          Check sheet
        </Heading>
        {sheet.rows.length === 0 ? <Verdict kind="holds" word="nothing is missing" /> : null}
        {sheet.rows.map((row, i) => (
          <Stack key={`${keyOf(row)}${i}`} gap={4}>
            <Row gap={12} justify="space-between" align="flex-start" wrap>
              <Text weight={600} style={{ flex: 1, minWidth: 200 }}>
                {row.message}
              </Text>
              <Verdict kind={verdictKind(row.verdict)} />
            </Row>
            <Text>{row.cure}</Text>
            <Text size="small" mono tone="ink2">
              {row.rule}, {row.level}
            </Text>
            {row.verdict === 'fails' ? (
              <TextArea
                label={`Publish all the same, because (readers see it): ${row.rule}`}
                value={reasons[keyOf(row)] ?? ''}
                onChange={(text) => setReasons({ ...reasons, [keyOf(row)]: text })}
                limit={limits.reason}
                error={
                  asked && short(row)
                    ? `Readers see it: at least ${shortestReason} characters. Nothing was published yet.`
                    : undefined
                }
              />
            ) : null}
            <Rule />
          </Stack>
        ))}
      </Section>
      <Section>
        <Heading level={2}>Publish</Heading>
        {unsaved ? (
          <Banner kind="fails">
            The draft is not saved yet, so nothing was published. It is kept here; see above what
            stands in the way, then publish again.
          </Banner>
        ) : null}
        {publish.isError ? <Banner kind="fails">{tell(publish.error).text}</Banner> : null}
        <TextArea
          label="What is new in this revision"
          value={note}
          onChange={setNote}
          limit={limits.reason}
        />
        <Row>
          <Button
            kind="primary"
            label={failing.length > 0 ? `Publish: ${failing.length} fail` : 'Publish'}
            onPress={() => void send()}
            busy={publish.isPending}
            busyLabel="Publishing"
          />
        </Row>
      </Section>
      <SavePlanFile document={editor.document} />
      <Revisions draft={draft} />
    </Stack>
  );
}

function Revisions({ draft }: { draft: Draft }) {
  const move = useMovePlan(draft.id);
  const router = useRouter();
  const failed = { onError: (error: unknown) => toast({ text: tell(error).text }) };
  return (
    <Section>
      <Heading level={2} note={String(draft.revisions.length)}>
        Revisions
      </Heading>
      {draft.revisions.map((r) => (
        <Text key={r.id}>
          <Link href={`/plans/${draft.slug ?? ''}?rev=${r.letter}`}>Rev {r.letter}</Link>,{' '}
          {new Date(r.publishedAt).toLocaleDateString()} {r.note}
        </Text>
      ))}
      <Row gap={12} wrap>
        {draft.state === 'published' ? (
          <Button label="Take it off the lists" onPress={() => move.mutate('unpublish', failed)} />
        ) : null}
        {draft.state === 'unpublished' ? (
          <Button
            label="Put it back on the lists"
            onPress={() => move.mutate('republish', failed)}
          />
        ) : null}
        {draft.revisions.length === 0 ? (
          <Button
            kind="danger"
            label="Throw the draft away"
            onPress={() =>
              move.mutate('delete', { ...failed, onSuccess: () => router.replace('/drafting') })
            }
          />
        ) : null}
      </Row>
    </Section>
  );
}
