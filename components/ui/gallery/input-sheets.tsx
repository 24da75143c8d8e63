import { useState } from 'react';
import { Checkbox, Switch } from '../checkbox';
import { FilePick } from '../file-pick';
import { Figure } from '../figure';
import { Icon } from '../icon';
import { Row } from '../layout';
import { Link } from '../link';
import { RadioGroup, SegmentedControl } from '../radio-group';
import { Select } from '../select';
import { NumberFigureField, PasswordField, TextArea, TextField } from '../text-field';
import { Sheet } from './sample';

const nothing = () => undefined;

export function InputsSheet() {
  const [name, setName] = useState('');
  const [note, setNote] = useState('The bed crept toward the clamp I closed first.');
  return (
    <Sheet title="Inputs">
      <TextField
        label="Name of the part"
        value={name}
        onChange={setName}
        placeholder="Fence"
        help="As the plan calls it."
      />
      <NumberFigureField
        label="Thickness"
        unit="in"
        value="1.1/2"
        onChange={nothing}
        error="Column 2: a point and a fraction don’t mix. Write 1 1/2 or 1.5."
      />
      <NumberFigureField
        label="Inside width"
        unit="mm"
        value="564.8"
        onChange={nothing}
        readOnly
        help="derived from width and sheet_t"
      />
      <TextField
        label="Find a plan"
        hideLabel
        type="search"
        placeholder="Find a plan"
        before={<Icon name="search" size={20} />}
        value=""
        onChange={nothing}
        small
      />
      <TextField label="Not yet" value="Choose a clip first" onChange={nothing} disabled optional />
      <PasswordField
        label="Password"
        value="mortise and tenon"
        onChange={nothing}
        help="Twelve characters or more. A phrase is fine."
      />
      <TextArea label="Why" value={note} onChange={setNote} limit={50} lines={3} />
    </Sheet>
  );
}

export function PickSheet() {
  const [tool, setTool] = useState('calipers');
  return (
    <Sheet title="Picking">
      <Select
        label="Instrument"
        value={tool}
        onChange={setTool}
        options={[
          { value: 'tape', label: 'Tape' },
          { value: 'rule', label: 'Steel rule' },
          { value: 'calipers', label: 'Calipers' },
        ]}
      />
      <Select
        label="Rule broken"
        value=""
        placeholder="Choose a rule"
        onChange={nothing}
        options={[{ value: 's2', label: 'S2' }]}
        error="Say which rule. Your text is kept."
      />
      <FilePick
        label="Choose a caption file"
        drop
        accept=".vtt,.srt"
        help="WebVTT or SubRip, 4 MB at most."
        onFiles={nothing}
      />
    </Sheet>
  );
}

export function ChoicesSheet() {
  const [on, setOn] = useState(true);
  const [tape, setTape] = useState<'tape' | 'rule' | 'calipers'>('rule');
  const [done, setDone] = useState<'none' | 'hide' | 'suspend'>('hide');
  return (
    <Sheet title="Choices">
      <Row wrap gap={24}>
        <Checkbox label="off" value={false} onChange={nothing} />
        <Checkbox label="on" value={on} onChange={setOn} />
        <Checkbox label="some" value="mixed" onChange={nothing} />
        <Switch label="off" value={false} onChange={nothing} />
        <Switch label="mail me" value={on} onChange={setOn} />
        <Checkbox label="can’t yet" value={false} onChange={nothing} disabled />
      </Row>
      <Checkbox
        label="I have read the terms"
        value={false}
        onChange={nothing}
        error="Tick it to go on. What you typed is kept."
      >
        I have read the <Link href="/gallery?terms">terms</Link>. A check that holds is not a
        promise of safety.
      </Checkbox>
      <SegmentedControl
        label="Instrument"
        value={tape}
        onChange={setTape}
        options={[
          { value: 'tape', label: 'tape' },
          {
            value: 'rule',
            label: 'rule, to one thirty-second',
            children: (
              <>
                rule, to <Figure figure="1/32" />
              </>
            ),
          },
          { value: 'calipers', label: 'calipers' },
        ]}
      />
      <RadioGroup
        label="What is done"
        value={done}
        onChange={setDone}
        options={[
          { value: 'none', label: 'No action', help: 'it stays as it is' },
          { value: 'hide', label: 'Hide', help: 'only the writer sees it, until changed' },
          {
            value: 'suspend',
            label: 'Suspend',
            help: 'the account is closed for a while',
            disabled: true,
          },
        ]}
      />
    </Sheet>
  );
}
