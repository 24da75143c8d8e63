import { useRouter } from 'expo-router';
import { useState } from 'react';
import { type PlanPage } from '../../shared/api/plans';
import { planFacts } from '../../shared/plan/facts';
import { useStartCopy } from '../bench/bench-queries';
import { useMe } from '../data/me-queries';
import { tell } from '../data/problems';
import { ReportDialog, type ReportSubject } from '../talk/report-dialog';
import { toast } from '../ui/announcer';
import { Button } from '../ui/button';
import { Figure } from '../ui/figure';
import { Heading } from '../ui/heading';
import { Page, Row, Section, Stack } from '../ui/layout';
import { Link } from '../ui/link';
import { Text } from '../ui/text';
import { TitleBlock } from '../ui/title-block';
import { Verdict } from '../ui/verdict';
import { Duration } from './duration';
import { type PlanValues } from './plan-model';

function mayWords(licence: PlanPage['document']['licence']): string {
  return (
    [
      licence.build ? 'build it for yourself' : '',
      licence.sell ? 'sell what you build' : '',
      licence.teach ? 'use it in a class' : '',
    ]
      .filter(Boolean)
      .join(', ') || 'read it'
  );
}

/** Title block, bench copy, revisions, and the usual notice. */
export function PlanAside({ page, values }: { page: PlanPage; values: PlanValues }) {
  const { document } = page;
  const facts = planFacts(document);
  const [reported, setReported] = useState<ReportSubject | null>(null);
  const verdicts = document.checks.map((c) => values.model.checks.get(c.id)?.verdict);
  const holding = verdicts.filter((v) => v === 'holds').length;
  return (
    <Page width="full">
      <TitleBlock
        label="Title block"
        rows={[
          [
            { label: 'Size over all', value: <Size page={page} values={values} />, share: 2 },
            { label: 'Rev', value: page.revision.letter },
          ],
          [
            { label: 'Hands on', value: <Duration minutes={facts.handsOn} /> },
            { label: 'With waits', value: <Duration minutes={facts.elapsed} /> },
          ],
          [
            {
              label: 'Stock',
              value: document.stock.map((s) => s.name).join(', ') || 'none listed',
            },
            {
              label: 'Checks',
              value: (
                <Verdict
                  kind={
                    verdicts.includes('fails')
                      ? 'fails'
                      : holding === verdicts.length
                        ? 'holds'
                        : 'risk'
                  }
                  word={`${holding} of ${verdicts.length} hold`}
                />
              ),
            },
          ],
          [{ label: 'You may', value: mayWords(document.licence), prose: true }],
        ]}
      />
      <Start page={page} />
      {page.revisions.length > 1 ? (
        <Section>
          <Heading level={2}>Revisions</Heading>
          {page.revisions.map((r) => (
            <Text key={r.id}>
              <Link href={`/plans/${page.slug}?rev=${r.letter}`}>Rev {r.letter}</Link> {r.note}
            </Text>
          ))}
        </Section>
      ) : null}
      <Row gap={16} wrap>
        <Button
          kind="quiet"
          size="small"
          label="Report this plan"
          onPress={() => setReported({ kind: 'plan', id: page.id, what: 'this plan' })}
        />
        {page.abilities.draft ? <Link href={`/drafting/${page.id}`}>Open the draft</Link> : null}
      </Row>
      <Text size="small" tone="ink2">
        Follow your machine’s manual, local codes and licensed practice. A check that holds is not a
        promise of safety.
      </Text>
      <ReportDialog subject={reported} onClose={() => setReported(null)} />
    </Page>
  );
}

function Size({ page, values }: { page: PlanPage; values: PlanValues }) {
  const { size } = page.document;
  if (!size) return <Text>not said</Text>;
  const figures = [size.length, size.width, size.height].map((text) =>
    values.length(values.model.evaluate(text).value?.x),
  );
  return (
    <Text weight={600}>
      {figures.map((figure, i) => (
        <Text key={i}>
          {i > 0 ? ' × ' : ''}
          {figure ? <Figure figure={figure} withoutUnit={i < 2} /> : '?'}
        </Text>
      ))}
    </Text>
  );
}

function Start({ page }: { page: PlanPage }) {
  const router = useRouter();
  const { me } = useMe();
  const start = useStartCopy();
  const open = (copyId: string) => router.push(`/bench/${copyId}`);
  if (page.myCopyId)
    return (
      <Button kind="primary" wide label="Go on at the bench" onPress={() => open(page.myCopyId!)} />
    );
  const press = () => {
    if (!me) return router.push(`/sign-in?next=/plans/${page.slug}`);
    start.mutate(
      { planId: page.id, revisionId: page.revision.id },
      { onSuccess: (copy) => open(copy.id), onError: (error) => toast({ text: tell(error).text }) },
    );
  };
  return (
    <Stack gap={8}>
      <Button
        kind="primary"
        wide
        label="Start a bench copy"
        onPress={press}
        busy={start.isPending}
        busyLabel="Starting"
      />
      {me ? null : (
        <Text size="note" tone="ink2">
          A bench copy keeps your readings; it needs an account.
        </Text>
      )}
    </Stack>
  );
}
