import { useState } from 'react';
import { Banner } from '../banner';
import { Button } from '../button';
import { Dialog, DialogFace } from '../dialog';
import { DimensionLine } from '../dimension-line';
import { Figure } from '../figure';
import { Heading } from '../heading';
import { Icon, type IconName } from '../icon';
import { iconPaths } from '../icons.data';
import { Row, Stack } from '../layout';
import { Mark } from '../mark';
import { Progress } from '../progress';
import { Prose } from '../prose';
import { EmptyState, ErrorState, LoadingLines } from '../states';
import { Table, type Column } from '../table';
import { PartMark } from '../tag';
import { Text } from '../text';
import { TitleBlock } from '../title-block';
import { toast, ToastBar } from '../announcer';
import { typeScale, type TypeSize } from '../tokens';
import { Verdict, VerdictShape, type VerdictKind } from '../verdict';
import { View } from 'react-native';
import { Sheet } from './sample';

const verdicts: VerdictKind[] = ['holds', 'risk', 'fails', 'need', 'close'];
const nothing = () => undefined;

export function TypeSheet() {
  return (
    <Sheet title="Type" note="Atkinson Hyperlegible Next and Mono">
      <Mark size={48} />
      {(Object.keys(typeScale) as TypeSize[]).map((size) => (
        <Text key={size} size={size}>
          {size}
        </Text>
      ))}
      <Text>
        Body with <Text weight={600}>a strong run</Text>, <Text italic>a slanted one</Text>,{' '}
        <Text mono>sheet_t</Text>, and <Text tone="ink3">a quiet one</Text>.
      </Text>
      <Heading level={4} note="14 readings">
        A smaller heading
      </Heading>
    </Sheet>
  );
}

export function FiguresSheet() {
  return (
    <Sheet title="Figures">
      <Row gap={24} align="baseline" wrap>
        <Figure size="note" figure="9 1/4 in" />
        <Figure size="body" figure="23/32 in" />
        <Figure size="lead" figure="± 1/64 in" />
        <Figure size="heading" figure="564.8 mm" />
        <Figure size="heading" figure="-0.4 mm" />
        <Figure size="body" figure="12:22" />
        <Figure size="body" figure="45°" />
      </Row>
      <Row gap={24} wrap>
        <Figure size="figure" weight={700} figure="2 3/4 in" fraction="stacked" />
        <Figure size="bench" weight={700} figure="1 15/16 in" />
      </Row>
      <Text>
        The runway is <Figure figure="2 3/4 in" weight={600} /> wide, the sheet{' '}
        <Figure figure="17.6 mm" /> thick.
      </Text>
      <Row gap={24}>
        <DimensionLine length={120} reach={40} />
        <DimensionLine length={80} tone="ink" />
      </Row>
      <Row gap={24} wrap>
        {verdicts.map((kind) => (
          <Verdict key={kind} kind={kind} />
        ))}
        <VerdictShape kind="fails" size={40} label="fails" />
      </Row>
    </Sheet>
  );
}

interface Part {
  letter: string;
  name: string;
  length: string;
  check: VerdictKind;
}
const parts: Part[] = [
  { letter: 'A', name: 'Side, at rest', length: '564.2', check: 'holds' },
  { letter: 'B', name: 'Top', length: '9 1/4', check: 'holds' },
  { letter: 'C', name: 'Shelf, chosen', length: '564.2', check: 'risk' },
  { letter: 'D', name: 'Door, failing', length: '23/32', check: 'fails' },
  { letter: 'E', name: 'Cleat, not ready', length: '64.2', check: 'need' },
];
const columns: Column<Part>[] = [
  {
    key: 'part',
    title: 'Part',
    cell: (p) => (
      <Row>
        <PartMark letter={p.letter} />
        <Text size="note">{p.name}</Text>
      </Row>
    ),
  },
  {
    key: 'length',
    title: 'Length',
    unit: 'mm',
    align: 'right',
    cell: (p) => <Figure size="note" figure={p.length} />,
  },
  {
    key: 'check',
    title: 'Check',
    width: 'max-content',
    cell: (p) => <Verdict size="small" kind={p.check} />,
  },
];

export function TablesSheet({ theme }: { theme: string }) {
  const [chosen, setChosen] = useState('C');
  return (
    <Sheet title="Tables and title block">
      <Table
        label={`Sample parts, ${theme}`}
        columns={columns}
        rows={parts}
        rowKey={(p) => p.letter}
        rowState={(p) =>
          p.letter === chosen ? 'chosen' : p.check === 'fails' ? 'fails' : undefined
        }
        onRowPress={(p) => setChosen(p.letter)}
        rowLabel={(p) => `Open part ${p.letter}, ${p.name}`}
      />
      <TitleBlock
        label="Sample facts"
        rows={[
          [
            {
              label: 'Size over all',
              value: (
                <Text weight={600}>
                  <Figure figure="12" weight={600} /> × <Figure figure="20 in" weight={600} />
                </Text>
              ),
              share: 2,
            },
            { label: 'Rev', value: 'C' },
          ],
          [
            { label: 'Stock', value: 'Quarter sheet of ply, one hardwood strip' },
            { label: 'Check sheet', value: <Verdict kind="holds" word="14 hold" /> },
          ],
          [
            {
              label: 'You may',
              value: 'build it for yourself, sell what you build, use it in a class',
              prose: true,
            },
          ],
        ]}
      />
    </Sheet>
  );
}

export function OverlaysSheet() {
  const [open, setOpen] = useState(false);
  return (
    <Sheet title="Dialog, toast, banner">
      <DialogFace
        title="Give up bench copy “Shooting board”?"
        onClose={nothing}
        action={{ label: 'Give it up', onPress: nothing, danger: true }}
      >
        Your 9 readings and 4 photos go with it. The plan stays.
      </DialogFace>
      <Row>
        <Button label="Open a dialog" onPress={() => setOpen(true)} />
        <Button
          label="Show a toast"
          onPress={() =>
            toast({ text: 'Part D dropped.', action: { label: 'Undo', onPress: nothing } })
          }
        />
      </Row>
      <Dialog
        open={open}
        title="Give it up?"
        onClose={() => setOpen(false)}
        action={{ label: 'Give it up', danger: true, onPress: () => setOpen(false) }}
      >
        The plan stays.
      </Dialog>
      <ToastBar
        message={{ text: 'Part D dropped.', action: { label: 'Undo', onPress: nothing } }}
        onDismiss={nothing}
      />
      <Banner kind="risk" action={{ label: 'Read', href: '/gallery?note' }}>
        Step 5 has a safety note. Read it before you cut.
      </Banner>
      <Banner kind="fails" announce={false} action={{ label: 'Try again', onPress: nothing }}>
        Not saved: the server did not answer. Your text is kept here.
      </Banner>
      <Banner kind="holds">Sent. It goes to 31 builders.</Banner>
      <Banner kind="note">Revision C is out.</Banner>
      <Banner kind="no-signal">
        No signal. 3 things wait on this phone and go when it is back.
      </Banner>
    </Sheet>
  );
}

export function WaitingSheet() {
  return (
    <Sheet title="Empty, error, progress, loading">
      <Progress label="Uploading clip.mov" value={0.62} />
      <LoadingLines label="Loading the plan" />
      <EmptyState
        level={4}
        title="Nothing on the bench"
        actions={<Button kind="primary" label="Find a plan" wide />}
      >
        Start a bench copy from any plan. It keeps your readings, ticks and photos on this phone,
        and works with no signal.
      </EmptyState>
      <ErrorState
        level={4}
        title="The report did not go out"
        happened="The server stopped answering after photo 2 of 5."
        kept="Your text and 9 readings, on this phone."
        todo="Try again now, or leave it: it goes by itself when the signal is back."
        onRetry={nothing}
        code="upload/stopped"
        at="16:20"
      />
    </Sheet>
  );
}

const sampleProse = `Cut {{part:A}} to {{dim:runway}} first. **Then** plane it, *with the grain*.

1. Hold the fence.
2. Check with \`made(inner_w)\`.

- [A link](https://example.org/), not [a script](javascript:alert(1))
- <b>raw HTML</b> stays text

> Push the spacer tight before you touch a clamp.

## A heading of theirs`;

export function ProseSheet() {
  return (
    <Sheet title="People’s own text">
      <Prose
        headingsFrom={3}
        renderReference={({ kind, id }) =>
          kind === 'part' ? <PartMark letter={id} /> : <Figure figure="2 3/4 in" weight={600} />
        }
      >
        {sampleProse}
      </Prose>
    </Sheet>
  );
}

export function IconsSheet() {
  return (
    <Sheet title="Icons" note="24 grid, 1.5 line">
      <Row gap={16} wrap>
        {(Object.keys(iconPaths) as IconName[]).map((name) => (
          <View key={name} style={{ width: 76, alignItems: 'center', gap: 4 }}>
            <Icon name={name} />
            <Text size="small" mono tone="ink2">
              {name}
            </Text>
          </View>
        ))}
      </Row>
    </Sheet>
  );
}

export function GalleryStack({ theme }: { theme: string }) {
  return (
    <Stack>
      <TypeSheet />
      <FiguresSheet />
      <TablesSheet theme={theme} />
      <OverlaysSheet />
      <WaitingSheet />
      <ProseSheet />
      <IconsSheet />
    </Stack>
  );
}
