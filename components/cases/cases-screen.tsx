import { useRouter } from 'expo-router';
import { useState } from 'react';
import { type CaseCard } from '../../shared/api/cases';
import { SignedIn } from '../account/signed-in';
import { tell } from '../data/problems';
import { PageHead } from '../shell/page-head';
import { problemWords } from '../talk/report-dialog';
import { Button } from '../ui/button';
import { Page, Row } from '../ui/layout';
import { SegmentedControl } from '../ui/radio-group';
import { EmptyState, ErrorState, LoadingLines } from '../ui/states';
import { Table, type Column } from '../ui/table';
import { useCases } from './case-queries';

const columns: Column<CaseCard>[] = [
  { key: 'number', title: 'Case', cell: (c) => String(c.number), width: '64px' },
  { key: 'problem', title: 'Problem', cell: (c) => problemWords[c.problem] },
  { key: 'subject', title: 'About', cell: (c) => c.subject.title, width: 'minmax(0, 2fr)' },
  { key: 'reports', title: 'Reports', align: 'right', cell: (c) => String(c.reports) },
  { key: 'worker', title: 'On it', cell: (c) => c.workedBy?.displayName ?? 'nobody' },
];

export function CasesScreen() {
  return (
    <SignedIn title="Cases" what="Moderators work on reports here.">
      {(me) => (me.abilities.moderate ? <Queue /> : <NotForYou />)}
    </SignedIn>
  );
}

function NotForYou() {
  return (
    <>
      <PageHead title="Cases" />
      <Page>
        <EmptyState title="For moderators">
          Cases are worked on by moderators. To report something, use the flag beside it.
        </EmptyState>
      </Page>
    </>
  );
}

function Queue() {
  const router = useRouter();
  const [state, setState] = useState<'open' | 'ruled'>('open');
  const cases = useCases(state);
  const rows = cases.data?.pages.flatMap((p) => p.items) ?? [];
  return (
    <>
      <PageHead title="Cases" sub="danger first, then oldest" />
      <Page>
        <Row>
          <SegmentedControl
            label="Which cases"
            hideLabel
            options={[
              { value: 'open', label: 'open' },
              { value: 'ruled', label: 'ruled' },
            ]}
            value={state}
            onChange={setState}
          />
        </Row>
        {cases.isError ? (
          <ErrorState
            title="The queue did not come"
            happened={tell(cases.error).text}
            code={tell(cases.error).code}
            onRetry={() => void cases.refetch()}
          />
        ) : !cases.data ? (
          <LoadingLines label="Loading the queue" />
        ) : rows.length === 0 ? (
          <EmptyState title={state === 'open' ? 'No open cases' : 'Nothing ruled yet'}>
            Reports on one thing gather in a case and stand here.
          </EmptyState>
        ) : (
          <Table
            label="Cases"
            columns={columns}
            rows={rows}
            rowKey={(c) => c.id}
            onRowPress={(c) => router.push(`/cases/${c.id}`)}
            rowLabel={(c) => `Case ${c.number}`}
          />
        )}
        {cases.hasNextPage ? (
          <Button label="Show more" onPress={() => void cases.fetchNextPage()} />
        ) : null}
      </Page>
    </>
  );
}
