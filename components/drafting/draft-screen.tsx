import { useLocalSearchParams, useRouter } from 'expo-router';
import { useCallback, useState } from 'react';
import { View } from 'react-native';
import { type Draft } from '../../shared/api/plans';
import { type SheetRow } from '../../shared/plan/sheet';
import { SignedIn } from '../account/signed-in';
import { ApiProblem, tell } from '../data/problems';
import { PageHead } from '../shell/page-head';
import { Banner } from '../ui/banner';
import { Button } from '../ui/button';
import { Dialog } from '../ui/dialog';
import { Page, Row, Stack, WorkPanes } from '../ui/layout';
import { ErrorState, LoadingLines } from '../ui/states';
import { TabPanel, Tabs } from '../ui/tabs';
import { Text } from '../ui/text';
import { useMounted } from '../ui/use-media';
import { AboutPane } from './about-pane';
import { CaptionsList, useCues } from './captions-list';
import { ClipPane } from './clip-pane';
import { useClipPlace } from './clip-place';
import { useDraft } from './drafting-queries';
import { DimensionsTab } from './dimensions/dimensions-tab';
import { ChecksTab } from './checks-tab';
import { PartsTab, ToolsTab } from './lists-tab';
import { PublishPane } from './publish-pane';
import { SheetPane } from './sheet-pane';
import { StepsPane } from './steps-pane';
import { useDraftEditor, type DraftEditor, type Kept } from './use-draft-editor';

/** The drafting of one plan. */
export function DraftScreen() {
  const { planId } = useLocalSearchParams<{ planId: string }>();
  const mounted = useMounted();
  if (!mounted) return <Loading />;
  return (
    <SignedIn title="Draft" what="Makers work on their plans here.">
      {() => <Loaded planId={planId} />}
    </SignedIn>
  );
}

function Loading() {
  return (
    <>
      <PageHead title="Draft" back="/drafting" />
      <Page>
        <LoadingLines label="Loading the draft" />
      </Page>
    </>
  );
}

function Loaded({ planId }: { planId: string }) {
  const draft = useDraft(planId);
  if (draft.data && !draft.isFetching)
    return (
      <Editing
        key={`${draft.data.id}-${draft.data.state}-${draft.data.revisions.length}`}
        draft={draft.data}
      />
    );
  if (!draft.isError) return <Loading />;
  const gone = draft.error instanceof ApiProblem && draft.error.status < 500;
  return (
    <>
      <PageHead title="Draft" back="/drafting" />
      <Page>
        <ErrorState
          title={gone ? 'This draft is not here' : 'The draft did not come'}
          happened={tell(draft.error).text}
          code={tell(draft.error).code}
          onRetry={() => void draft.refetch()}
        />
      </Page>
    </>
  );
}

const tabs = [
  { value: 'steps', label: 'Clip and steps' },
  { value: 'dimensions', label: 'Dimensions' },
  { value: 'checks', label: 'Checks' },
  { value: 'parts', label: 'Parts and stock' },
  { value: 'tools', label: 'Tools and links' },
  { value: 'about', label: 'About' },
  { value: 'publish', label: 'Publish' },
] as const;
type Tab = (typeof tabs)[number]['value'];

/** How things stand with keeping, in a line. */
export function keptWords(kept: Kept): string {
  if (kept.state === 'kept')
    return kept.at
      ? `Kept ${kept.at.toLocaleTimeString(undefined, { hour: '2-digit', minute: '2-digit' })}`
      : 'Kept';
  if (kept.state === 'no-signal') return 'No signal. Kept in this browser';
  if (kept.state === 'refused') return 'Not taken; kept in this browser';
  if (kept.state === 'stale') return 'Another window saved first';
  return 'Keeping';
}

/** The open tab, in the address, so that it is the same after a reload and can be sent to oneself. */
function useTab() {
  const { tab: asked } = useLocalSearchParams<{ tab?: string }>();
  const router = useRouter();
  const tab = tabs.find(({ value }) => value === asked)?.value ?? 'steps';
  const setTab = useCallback((next: Tab) => router.setParams({ tab: next }), [router]);
  return { tab, setTab };
}

function Editing({ draft }: { draft: Draft }) {
  const editor = useDraftEditor(draft);
  const { document, kept } = editor;
  const { tab, setTab } = useTab();
  const [step, setStep] = useState<string | null>(null);
  const [dimension, setDimension] = useState<string | null>(null);
  /** The element of a list that a row of the sheet led to. */
  const [element, setElement] = useState<string | null>(null);
  const { steps } = document;
  const toPlace = useCallback(
    ({ place: { in: list, elementId } }: SheetRow) => {
      if (list === 'steps') setStep(elementId);
      else if (list === 'photos')
        setStep(steps.find((s) => elementId && s.photoIds.includes(elementId))?.id ?? null);
      else if (list === 'dimensions') setDimension(elementId);
      else setElement(elementId);
      setTab(tabOf[list] ?? 'about');
    },
    [setTab, steps],
  );
  return (
    <>
      <PageHead title={document.title || 'Untitled'} back="/drafting" sub={keptWords(kept)} />
      <Page width="full">
        {kept.state === 'refused' ? <Banner kind="fails">{kept.text}</Banner> : null}
        <Tabs
          label="Parts of the draft"
          tabs={tabs}
          value={tab}
          onChange={setTab}
          id="draft"
          fill={false}
        />
        <TabPanel id="draft" value={tab}>
          {tab === 'steps' ? (
            <StepsTab editor={editor} open={step} setOpen={setStep} onPlace={toPlace} />
          ) : null}
          {tab === 'dimensions' ? (
            <DimensionsTab
              editor={editor}
              chosen={dimension}
              onChoose={setDimension}
              onPlace={toPlace}
            />
          ) : null}
          {tab === 'checks' ? (
            <ChecksTab key={element} editor={editor} start={element} onPlace={toPlace} />
          ) : null}
          {tab === 'parts' ? (
            <PartsTab key={element} editor={editor} start={element} onPlace={toPlace} />
          ) : null}
          {tab === 'tools' ? (
            <ToolsTab key={element} editor={editor} start={element} onPlace={toPlace} />
          ) : null}
          {tab === 'about' ? <AboutPane editor={editor} /> : null}
          {tab === 'publish' ? <PublishPane draft={draft} editor={editor} /> : null}
        </TabPanel>
      </Page>
      <StaleChoice key={kept.state} kept={kept} choose={editor.choose} />
    </>
  );
}

/** Where each list of the plan is edited. */
const tabOf: Partial<Record<SheetRow['place']['in'], Tab>> = {
  dimensions: 'dimensions',
  checks: 'checks',
  parts: 'parts',
  stock: 'parts',
  hardware: 'parts',
  tools: 'tools',
  links: 'tools',
  clip: 'steps',
  photos: 'steps',
  steps: 'steps',
};

interface StepsTabProps {
  editor: DraftEditor;
  open: string | null;
  setOpen: (id: string | null) => void;
  onPlace: (row: SheetRow) => void;
}

/** Clip and captions at the left, the steps on the stick, the check sheet: three panes at a desk. */
function StepsTab({ editor, open, setOpen, onPlace }: StepsTabProps) {
  const place = useClipPlace();
  const { clip } = editor.document;
  const hash = clip.source === 'none' ? undefined : clip.captions;
  const { cues, missing } = useCues(hash);
  return (
    <WorkPanes
      below={150}
      panes={[
        {
          key: 'clip',
          label: 'Clip and captions',
          width: 340,
          content: (
            <Stack gap={16} style={{ padding: 4 }}>
              <ClipPane editor={editor} place={place} />
              {hash ? <CaptionsList cues={cues} missing={missing} place={place} /> : null}
            </Stack>
          ),
        },
        {
          key: 'steps',
          label: 'Steps',
          content: (
            <View style={{ padding: 4, paddingHorizontal: 12 }}>
              <StepsPane editor={editor} place={place} cues={cues} open={open} setOpen={setOpen} />
            </View>
          ),
        },
        {
          key: 'sheet',
          label: 'Check sheet',
          width: 300,
          content: (
            <View style={{ padding: 4, paddingHorizontal: 12 }}>
              <SheetPane model={editor.model} onPlace={onPlace} onChange={editor.change} />
            </View>
          ),
        },
      ]}
    />
  );
}

interface StaleChoiceProps {
  kept: Kept;
  choose: (which: 'mine' | 'other') => void;
}

/** Two versions of one plan: the person chooses, now or later; nothing is lost meanwhile. */
function StaleChoice({ kept, choose }: StaleChoiceProps) {
  const [later, setLater] = useState(false);
  if (kept.state !== 'stale') return null;
  if (later) {
    return (
      <Banner kind="risk" action={{ label: 'Choose now', onPress: () => setLater(false) }}>
        Another window saved this plan first. What you change is kept in this browser only.
      </Banner>
    );
  }
  return (
    <Dialog
      open
      title="Another window saved this plan first. Which one goes on?"
      onClose={() => setLater(true)}
      keep="Decide later"
      action={{ label: 'Keep mine', onPress: () => choose('mine') }}
    >
      <Stack gap={12}>
        <Text>
          What you have here is kept in this browser until you choose. Keeping yours puts it over
          the other; taking the other lets go of yours.
        </Text>
        <Row>
          <Button label="Take the other" onPress={() => choose('other')} />
        </Row>
      </Stack>
    </Dialog>
  );
}
