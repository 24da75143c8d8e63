import { useId, useState } from 'react';
import { Button } from '../button';
import { IconButton } from '../icon-button';
import { Row, Stack } from '../layout';
import { Link } from '../link';
import { Menu, MenuList } from '../menu';
import { type ForcedLook } from '../pressable';
import { LinkTabs, TabPanel, Tabs } from '../tabs';
import { KeyHint, PartMark, Tag } from '../tag';
import { Text } from '../text';
import { Figure } from '../figure';
import { Sample, Sheet } from './sample';

const looks: [string, ForcedLook | undefined][] = [
  ['at rest', undefined],
  ['hover', 'hover'],
  ['pressed', 'pressed'],
  ['focus', 'focus'],
];

export function ButtonsSheet() {
  return (
    <Sheet title="Buttons" note="48, small 36 with a mouse, bench 56 and up">
      {looks.map(([name, look]) => (
        <Sample key={name} name={name}>
          <Button kind="primary" label="Take reading" look={look} />
          <Button label="Again" look={look} />
          <Button kind="quiet" label="Leave it" look={look} />
          <IconButton icon="camera" label="Take a photo" look={look} />
        </Sample>
      ))}
      <Sample name="can’t yet">
        <Button kind="primary" label="Take reading" disabled />
        <Button label="Again" disabled />
        <Button kind="quiet" label="Leave it" disabled />
        <IconButton icon="camera" label="Take a photo" disabled />
      </Sample>
      <Sample name="working">
        <Button kind="primary" label="Send" busy busyLabel="Sending" />
        <Button label="Upload" busy={0.7} busyLabel="Uploading" />
        <Button kind="danger" label="Take it down" icon="bin" />
      </Sample>
      <Sample name="small, big">
        <Button size="small" kind="primary" label="Keep" />
        <Button size="small" label="Change" />
        <Button size="small" label="Go on with 23/32 in">
          Go on with <Figure figure="23/32 in" />
        </Button>
        <Button size="bench" label="Read again" />
        <Button size="benchPrimary" kind="primary" label="Next" iconAfter="next" />
      </Sample>
    </Sheet>
  );
}

const tabs = [
  { value: 'clip', label: 'Clip' },
  { value: 'steps', label: 'Steps' },
  { value: 'checks', label: 'Checks' },
] as const;

export function TabsSheet({ theme }: { theme: string }) {
  const id = useId();
  const [tab, setTab] = useState<'clip' | 'steps' | 'checks'>('clip');
  return (
    <Sheet title="Tabs and links" note="a long mark says where you are">
      <Tabs label={`Sample tabs, ${theme}`} id={id} tabs={tabs} value={tab} onChange={setTab} />
      <TabPanel id={id} value={tab}>
        <Text size="note">The {tab} panel.</Text>
      </TabPanel>
      <LinkTabs
        label={`Sample pages, ${theme}`}
        current="/gallery"
        tabs={[
          { href: '/gallery', label: 'Clip and steps' },
          { href: '/gallery?dimensions', label: 'Dimensions' },
        ]}
      />
      <Text>
        A link <Link href="/gallery">in text</Link>, one{' '}
        <Link href="https://example.org/">to somewhere else</Link>, and keys: <KeyHint keys="Alt" />
      </Text>
    </Sheet>
  );
}

export function MarksSheet() {
  const [on, setOn] = useState(true);
  return (
    <Sheet title="Tags and marks">
      <Row wrap>
        <Tag label="taken" />
        <Tag label="change" kind="on" icon="edit" />
        <Tag label="runway two and three quarters inches" kind="reference" icon="dim">
          runway <Figure figure="2 3/4 in" />
        </Tag>
        <Tag label="not here" kind="absent" />
        <Tag label="all 11" kind={on ? 'on' : 'plain'} onPress={() => setOn(!on)} />
        <Tag label="focus" look="focus" onPress={() => undefined} />
      </Row>
      <Row>
        <PartMark letter="A" />
        <PartMark letter="AA" />
        <PartMark letter="B" size="bench" />
        <Text>
          Glue bed <PartMark letter="B" /> to base <PartMark letter="A" />.
        </Text>
      </Row>
    </Sheet>
  );
}

const menuItems = [
  { label: 'Copy the link', icon: 'link', onPress: () => undefined },
  { label: 'Calipers', onPress: () => undefined, chosen: true },
  { label: 'Not now', onPress: () => undefined, disabled: true },
  { label: 'Take it down', onPress: () => undefined, danger: true },
] as const;

export function MenuSheet({ theme }: { theme: string }) {
  return (
    <Sheet title="Menu">
      <Menu
        label={`Sample actions, ${theme}`}
        items={menuItems}
        trigger={(t) => <IconButton icon="more" label="More" {...t} />}
      />
      <Stack gap={4}>
        <MenuList label={`Sample list, ${theme}`} items={menuItems} onDone={() => undefined} />
      </Stack>
    </Sheet>
  );
}
