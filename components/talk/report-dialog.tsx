import { useState } from 'react';
import { v7 as uuid } from 'uuid';
import { problemKinds, reportThing, type subjectKinds } from '../../shared/api/cases';
import { useMe } from '../data/me-queries';
import { ApiProblem, tell } from '../data/problems';
import { Banner } from '../ui/banner';
import { Dialog } from '../ui/dialog';
import { Stack } from '../ui/layout';
import { Select } from '../ui/select';
import { Text } from '../ui/text';
import { TextArea, TextField } from '../ui/text-field';
import { useReport } from './talk-queries';

export const problemWords: Record<(typeof problemKinds)[number], string> = {
  'dangerous-advice': 'dangerous advice',
  abuse: 'abuse',
  'copied-work': 'copied work',
  'not-the-owner': 'not the owner of the video',
  disclosure: 'a link that hides what it earns',
  spam: 'spam',
  other: 'something else',
};

export interface ReportSubject {
  kind: (typeof subjectKinds)[number];
  id: string;
  /** Said in the title, e.g. `this comment`. */
  what: string;
}

/** Anyone can report; signed out an e-mail is asked for, to tell the outcome. */
export function ReportDialog({
  subject,
  onClose,
}: {
  subject: ReportSubject | null;
  onClose: () => void;
}) {
  return subject ? <OpenReport subject={subject} onClose={onClose} /> : null;
}

function OpenReport({ subject, onClose }: { subject: ReportSubject; onClose: () => void }) {
  const { me } = useMe();
  const report = useReport();
  const [id] = useState(() => uuid());
  const [problem, setProblem] = useState<(typeof problemKinds)[number]>('dangerous-advice');
  const [reason, setReason] = useState('');
  const [email, setEmail] = useState('');
  const [faults, setFaults] = useState<Record<string, string>>({});
  const send = () => {
    const body = {
      id,
      subject: { kind: subject.kind, id: subject.id },
      problem,
      reason,
      ...(me ? {} : { email }),
    };
    const parsed = reportThing.body?.safeParse(body);
    const found = Object.fromEntries(
      (parsed?.error?.issues ?? []).map((i) => [String(i.path[0]), i.message]),
    );
    setFaults(found);
    if (Object.keys(found).length > 0) return;
    report.mutate(body, {
      onError: (error) => {
        if (error instanceof ApiProblem)
          setFaults(Object.fromEntries(error.issues.map((i) => [String(i.path[0]), i.message])));
      },
    });
  };
  if (report.isSuccess) {
    return (
      <Dialog open title="Report received" onClose={onClose} keep="Close">
        <Text>
          Your receipt is {report.data.receipt}. A moderator looks at it; you are told what came of
          it.
        </Text>
      </Dialog>
    );
  }
  return (
    <Dialog
      open
      wide
      title={`Report ${subject.what}?`}
      onClose={onClose}
      keep="Leave it"
      action={{ label: 'Send the report', onPress: send, busy: report.isPending }}
    >
      <Stack gap={16}>
        {report.isError ? <Banner kind="fails">{tell(report.error).text}</Banner> : null}
        <Select
          label="What kind of problem"
          options={problemKinds.map((value) => ({ value, label: problemWords[value] }))}
          value={problem}
          onChange={setProblem}
        />
        <TextArea
          label="What is wrong"
          value={reason}
          onChange={setReason}
          error={faults.reason}
          help="A sentence or two: which words, why."
        />
        {me ? null : (
          <TextField
            label="Your e-mail"
            type="email"
            value={email}
            onChange={setEmail}
            error={faults.email}
            help="Only to tell you the outcome."
          />
        )}
      </Stack>
    </Dialog>
  );
}
