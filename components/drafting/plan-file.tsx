import { useRouter } from 'expo-router';
import { useState } from 'react';
import { v7 as uuid } from 'uuid';
import { limits } from '../../shared/api/limits';
import { exportPlan, importPlan, type ImportFault } from '../../shared/plan/interchange';
import { type PlanDocument } from '../../shared/plan/document';
import { tell } from '../data/problems';
import { Banner } from '../ui/banner';
import { Button } from '../ui/button';
import { FilePick } from '../ui/file-pick';
import { Stack } from '../ui/layout';
import { Text } from '../ui/text';
import { useCreateDraft } from './drafting-queries';

/** Saves the plan as one JSON file. */
export function SavePlanFile({ document: plan }: { document: PlanDocument }) {
  const save = () => {
    const url = URL.createObjectURL(new Blob([exportPlan(plan)], { type: 'application/json' }));
    const anchor = window.document.createElement('a');
    anchor.href = url;
    anchor.download = `${plan.title.toLowerCase().replace(/[^a-z0-9]+/g, '-') || 'plan'}.json`;
    anchor.click();
    URL.revokeObjectURL(url);
  };
  return <Button label="Save the plan as a file" icon="download" onPress={save} />;
}

const shownFaults = 20;

/** Makes a new plan of a plan file; a broken one lists every fault and makes nothing. */
export function BringPlanFile() {
  const router = useRouter();
  const create = useCreateDraft();
  const [faults, setFaults] = useState<readonly ImportFault[]>([]);
  const bring = async (file: File | undefined) => {
    if (!file) return;
    setFaults([]);
    let value: unknown;
    try {
      value = JSON.parse(await file.text());
    } catch {
      setFaults([{ path: file.name, code: 'json', message: 'This is not a JSON file.' }]);
      return;
    }
    const imported = importPlan(value);
    if (!imported.ok) {
      setFaults(imported.faults);
      return;
    }
    const { document } = imported;
    create.mutate(
      { id: uuid(), title: document.title || 'Untitled', units: document.units, document },
      { onSuccess: (draft) => router.push(`/drafting/${draft.id}`) },
    );
  };
  return (
    <Stack gap={12}>
      <FilePick
        label="Bring a plan file"
        accept=".json,application/json"
        maxBytes={limits.draftBytes}
        onFiles={(files) => void bring(files[0])}
      />
      {create.isError ? <Banner kind="fails">{tell(create.error).text}</Banner> : null}
      {faults.length > 0 ? (
        <Banner kind="fails">
          The plan was not taken; nothing was changed. {faults.length}{' '}
          {faults.length === 1 ? 'fault' : 'faults'}:
        </Banner>
      ) : null}
      {faults.slice(0, shownFaults).map((fault) => (
        <Text key={`${fault.path}${fault.code}${fault.message}`} size="note">
          <Text mono>{fault.path || 'the file'}</Text>: {fault.message}
        </Text>
      ))}
      {faults.length > shownFaults ? (
        <Text size="note">And {faults.length - shownFaults} more.</Text>
      ) : null}
    </Stack>
  );
}
