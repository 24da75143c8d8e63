import { useRouter } from 'expo-router';
import { useState } from 'react';
import { type Me } from '../../shared/api/accounts';
import { readEntriesFile, writeEntriesFile } from '../../shared/plan/bench/entries-file';
import { clearDevice } from '../data/clear-device';
import { useSignOut } from '../data/me-queries';
import { flushOutbox, keepEntry, type OutboxJob } from '../data/outbox';
import { useOutbox } from '../data/outbox-hooks';
import { tell } from '../data/problems';
import { toast } from '../ui/announcer';
import { Button } from '../ui/button';
import { Dialog } from '../ui/dialog';
import { FilePick } from '../ui/file-pick';
import { Row, Section, Stack } from '../ui/layout';
import { Text } from '../ui/text';

/** Hands the entries over as a file of the browser's downloads. */
function saveEntries(jobs: readonly OutboxJob[]): void {
  const now = new Date().toISOString();
  const text = writeEntriesFile(jobs, now);
  const url = URL.createObjectURL(new Blob([text], { type: 'application/json' }));
  const anchor = document.createElement('a');
  anchor.href = url;
  anchor.download = `bench-entries-${now.slice(0, 10)}.json`;
  anchor.click();
  URL.revokeObjectURL(url);
}

const countOf = (n: number) => (n === 1 ? '1 entry' : `${n} entries`);

/** Signing out; with unsent entries it first offers to send them, save them as a file or discard them. */
export function Leave({ me }: { me: Me }) {
  const signOut = useSignOut();
  const router = useRouter();
  const unsent = useOutbox().filter((job) => job.personId === me.id);
  const [asking, setAsking] = useState(false);
  const leave = () =>
    signOut.mutate(undefined, {
      onSuccess: () => {
        void clearDevice(me.id).then(() => router.replace('/'));
      },
      onError: (error) => toast({ text: `You are still signed in. ${tell(error).text}` }),
    });
  return (
    <Section>
      <Row gap={12} wrap>
        <Button
          label="Sign out"
          onPress={() => (unsent.length > 0 ? setAsking(true) : leave())}
          busy={signOut.isPending}
        />
        <EntriesFromFile personId={me.id} />
      </Row>
      {asking ? (
        <UnsentDialog
          personId={me.id}
          unsent={unsent}
          leave={leave}
          onClose={() => setAsking(false)}
        />
      ) : null}
    </Section>
  );
}

interface UnsentDialogProps {
  personId: string;
  unsent: readonly OutboxJob[];
  leave: () => void;
  onClose: () => void;
}

function UnsentDialog({ personId, unsent, leave, onClose }: UnsentDialogProps) {
  const [said, setSaid] = useState('');
  const [saved, setSaved] = useState<readonly OutboxJob[]>([]);
  const [sending, setSending] = useState(false);
  const inFile = unsent.every((job) => saved.some((s) => s.entry.id === job.entry.id));
  const refused = unsent.filter((job) => job.state === 'refused').length;
  const send = async () => {
    setSending(true);
    const { stopped } = await flushOutbox(personId);
    setSending(false);
    if (stopped === 'signed-out')
      setSaid('The session has ended. Sign in again, and they go by themselves.');
    else setSaid(stopped === 'no-signal' ? 'No signal. They are still kept here.' : '');
  };
  const save = () => {
    saveEntries(unsent);
    setSaved(unsent);
    setSaid(
      `${countOf(unsent.length)} saved as a file. You can take the file in again on this page.`,
    );
  };
  const close = unsent.length === 0 || inFile ? 'Sign out' : undefined;
  return (
    <Dialog
      open
      title={unsent.length > 0 ? 'Some of your bench entries are not sent' : 'All is sent'}
      onClose={onClose}
      keep="Stay signed in"
      action={{
        label: close ?? `Discard ${unsent.length} and sign out`,
        onPress: leave,
        danger: close === undefined,
      }}
    >
      <Stack gap={12}>
        <Text tone="ink2">
          {unsent.length > 0
            ? `${countOf(unsent.length)} only on this device. Signing out clears what is kept here.`
            : 'Signing out clears what is kept on this device.'}
          {refused > 0 ? ` The server did not take ${refused} of them; see Bench.` : ''}
        </Text>
        {said ? <Text role="status">{said}</Text> : null}
        {unsent.length > 0 ? (
          <Row gap={12} wrap>
            <Button label="Send now" busy={sending} onPress={() => void send()} />
            <Button label="Save as a file" icon="download" onPress={save} />
          </Row>
        ) : null}
      </Stack>
    </Dialog>
  );
}

/** Takes saved entries in again; their ids make taking them twice harmless. */
function EntriesFromFile({ personId }: { personId: string }) {
  const take = async (file: File | undefined) => {
    if (!file) return;
    const read = readEntriesFile(await file.text());
    if (!read.ok) {
      toast({ text: `${read.message} Nothing was taken. Choose the file that was saved here.` });
      return;
    }
    for (const { copyId, entry } of read.entries) await keepEntry(personId, copyId, entry);
    toast({ text: `${countOf(read.entries.length)} taken in. They go to the server now.` });
  };
  return (
    <FilePick
      label="Take in saved bench entries"
      accept=".json,application/json"
      maxBytes={20_000_000}
      onFiles={(files) => void take(files[0])}
    />
  );
}
