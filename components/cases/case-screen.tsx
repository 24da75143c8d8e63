import { useLocalSearchParams } from 'expo-router';
import { StyleSheet, View } from 'react-native';
import { type CaseView } from '../../shared/api/cases';
import { SignedIn } from '../account/signed-in';
import { ApiProblem, tell } from '../data/problems';
import { PageHead } from '../shell/page-head';
import { problemWords } from '../talk/report-dialog';
import { Banner } from '../ui/banner';
import { Button } from '../ui/button';
import { Heading } from '../ui/heading';
import { Page, Panes, Row, Rule, Section, Stack } from '../ui/layout';
import { Link } from '../ui/link';
import { Prose } from '../ui/prose';
import { ErrorState, LoadingLines } from '../ui/states';
import { Tag } from '../ui/tag';
import { Text } from '../ui/text';
import { colour, line } from '../ui/tokens';
import { useCase, useTakeCase } from './case-queries';
import { RulingForm } from './ruling-form';

const when = (at: string) =>
  new Date(at).toLocaleString(undefined, {
    day: 'numeric',
    month: 'long',
    hour: '2-digit',
    minute: '2-digit',
  });

export function CaseScreen() {
  const { caseId } = useLocalSearchParams<{ caseId: string }>();
  return (
    <SignedIn title="Case" what="Moderators work on reports here.">
      {(me) => <LoadedCase caseId={caseId} myId={me.id} />}
    </SignedIn>
  );
}

function LoadedCase({ caseId, myId }: { caseId: string; myId: string }) {
  const query = useCase(caseId);
  if (query.isError) {
    return (
      <>
        <PageHead title="Case" back="/cases" />
        <Page>
          <ErrorState
            title="The case did not come"
            happened={tell(query.error).text}
            code={tell(query.error).code}
            onRetry={() => void query.refetch()}
          />
        </Page>
      </>
    );
  }
  if (!query.data) {
    return (
      <>
        <PageHead title="Case" back="/cases" />
        <Page>
          <LoadingLines label="Loading the case" />
        </Page>
      </>
    );
  }
  return <Content view={query.data} myId={myId} />;
}

function Content({ view, myId }: { view: CaseView; myId: string }) {
  const person =
    view.person?.displayName ?? view.comment?.author.displayName ?? 'the person concerned';
  return (
    <Panes
      asideLabel="Ruling"
      aside={
        <Page width="full">
          {view.state === 'open' ? (
            <RulingForm view={view} person={person} />
          ) : (
            <Rulings view={view} />
          )}
        </Page>
      }
    >
      <PageHead
        title={`Case ${view.number}: ${problemWords[view.problem]}`}
        back="/cases"
        sub={`Opened ${when(view.openedAt)}, reports: ${view.reports}`}
      />
      <Page>
        <Worker view={view} myId={myId} />
        <Subject view={view} />
        <Section>
          <Heading level={2} note={String(view.reportList.length)}>
            Reports
          </Heading>
          {view.reportList.map((report) => (
            <Stack key={report.id} gap={8}>
              <Row justify="space-between" align="flex-start" gap={12}>
                <Text style={styles.words}>“{report.reason}”</Text>
                <Tag label={problemWords[report.problem]} />
              </Row>
              <Text size="note" tone="ink2">
                {report.by?.displayName ?? 'somebody not signed in'}, {when(report.at)}
              </Text>
              <Rule />
            </Stack>
          ))}
        </Section>
        <Section>
          <Heading level={2} note="nobody can edit it">
            Log
          </Heading>
          {view.log.map((row) => (
            <Row key={row.id} gap={16} align="baseline">
              <Text size="note" tone="ink2">
                {when(row.at)}
              </Text>
              <Text size="note" style={styles.words}>
                {row.text}
                {row.by ? ` (${row.by.displayName})` : ''}
              </Text>
            </Row>
          ))}
        </Section>
      </Page>
    </Panes>
  );
}

function Worker({ view, myId }: { view: CaseView; myId: string }) {
  const take = useTakeCase(view.id);
  if (view.state !== 'open') return null;
  if (view.workedBy?.id === myId) return <Text tone="ink2">You are on it.</Text>;
  const taken = take.error instanceof ApiProblem && take.error.code === 'cases/taken';
  return (
    <Stack gap={8}>
      {view.workedBy ? <Banner kind="risk">{view.workedBy.displayName} is on it.</Banner> : null}
      {take.isError ? <Banner kind="fails">{tell(take.error).text}</Banner> : null}
      <Button
        label={view.workedBy || taken ? 'Take it over' : 'I am on it'}
        onPress={() => take.mutate(Boolean(view.workedBy) || taken)}
        busy={take.isPending}
      />
    </Stack>
  );
}

function Subject({ view }: { view: CaseView }) {
  return (
    <View style={styles.subject}>
      <Stack gap={8}>
        <Text size="note" tone="ink2">
          {view.subject.title}
        </Text>
        {view.comment ? (
          <Prose size="lead">{view.comment.text || view.subject.excerpt}</Prose>
        ) : (
          <Text size="lead">{view.subject.excerpt}</Text>
        )}
        <Text size="note" tone="ink2">
          {view.person?.displayName ?? ''}
        </Text>
        {view.subject.planSlug ? (
          <Link href={`/plans/${view.subject.planSlug}`}>Open the plan</Link>
        ) : null}
      </Stack>
    </View>
  );
}

function Rulings({ view }: { view: CaseView }) {
  return (
    <Stack gap={16}>
      <Heading level={2}>Rulings</Heading>
      {view.rulings.map((ruling) => (
        <Stack key={ruling.id} gap={4}>
          <Text weight={600}>
            {ruling.act.replace('-', ' ')}
            {ruling.rule ? `, rule ${ruling.rule}` : ''}
          </Text>
          <Text>{ruling.reasons}</Text>
          <Text size="note" tone="ink2">
            {ruling.by.displayName}, {when(ruling.at)}
            {ruling.until ? `, until ${when(ruling.until)}` : ''}
          </Text>
        </Stack>
      ))}
    </Stack>
  );
}

const styles = StyleSheet.create({
  subject: { borderLeftWidth: line.thick, borderLeftColor: colour.fails, paddingLeft: 12 },
  words: { flexShrink: 1, flex: 1 },
});
