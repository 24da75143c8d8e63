import { useRef, useState } from 'react';
import { v7 as uuid } from 'uuid';
import { commentBody, type Anchor, type CommentBody } from '../../shared/api/talk';
import { limits } from '../../shared/api/limits';
import { ApiProblem, tell } from '../data/problems';
import { Banner } from '../ui/banner';
import { Button } from '../ui/button';
import { Form } from '../ui/form';
import { Row } from '../ui/layout';
import { SegmentedControl } from '../ui/radio-group';
import { Select } from '../ui/select';
import { TextArea } from '../ui/text-field';

export interface AnchorChoice {
  value: string;
  label: string;
  anchor: Anchor;
}

export interface CommentFormProps {
  /** Where it can hang: the plan, each step. */
  anchors: readonly AnchorChoice[];
  at?: string;
  submit: (body: CommentBody) => Promise<unknown>;
  onDone: () => void;
}

type Faults = Partial<Record<'text' | 'why', string>>;

/** The issues of a body that does not pass, by field. */
export function faultsOf(body: unknown): Faults {
  const parsed = commentBody.safeParse(body);
  if (parsed.success) return {};
  return Object.fromEntries(parsed.error.issues.map((i) => [String(i.path[0]), i.message]));
}

/** A critique says keep or change, and why; a question asks. */
export function CommentForm({ anchors, at, submit, onDone }: CommentFormProps) {
  const [kind, setKind] = useState<'critique' | 'question'>('critique');
  const [stance, setStance] = useState<'keep' | 'change'>('change');
  const [place, setPlace] = useState(at ?? anchors[0]?.value ?? '');
  const [text, setText] = useState('');
  const [why, setWhy] = useState('');
  const [faults, setFaults] = useState<Faults>({});
  const [trouble, setTrouble] = useState<string | null>(null);
  const [busy, setBusy] = useState(false);
  // One id for one comment, however often it has to be sent.
  const id = useRef(uuid());
  const send = async () => {
    const anchor = anchors.find((a) => a.value === place)?.anchor ?? { on: 'plan' as const };
    const body: CommentBody =
      kind === 'critique'
        ? { id: id.current, kind, anchor, stance, text, why }
        : { id: id.current, kind, anchor, text };
    const found = faultsOf(body);
    setFaults(found);
    setTrouble(null);
    if (Object.keys(found).length > 0) return;
    setBusy(true);
    try {
      await submit(body);
      id.current = uuid();
      onDone();
    } catch (error) {
      setTrouble(tell(error).text);
      if (error instanceof ApiProblem) {
        setFaults(Object.fromEntries(error.issues.map((i) => [String(i.path[0]), i.message])));
      }
    } finally {
      setBusy(false);
    }
  };
  return (
    <Form label="Say something about the plan" onSubmit={() => void send()}>
      {trouble ? <Banner kind="fails">{trouble} Your words are still here.</Banner> : null}
      <SegmentedControl
        label="What is it"
        options={[
          { value: 'critique', label: 'critique' },
          { value: 'question', label: 'question' },
        ]}
        value={kind}
        onChange={setKind}
      />
      <Select label="About" options={anchors} value={place} onChange={setPlace} />
      {kind === 'critique' ? (
        <SegmentedControl
          label="Keep it or change it"
          options={[
            { value: 'keep', label: 'keep' },
            { value: 'change', label: 'change' },
          ]}
          value={stance}
          onChange={setStance}
        />
      ) : null}
      <TextArea
        label={
          kind === 'question'
            ? 'Your question'
            : stance === 'keep'
              ? 'What should stay'
              : 'What should change'
        }
        value={text}
        onChange={setText}
        limit={limits.commentText}
        error={faults.text}
      />
      {kind === 'critique' ? (
        <TextArea
          label="Why"
          value={why}
          onChange={setWhy}
          limit={limits.reason}
          error={faults.why}
          help="The reason is what the maker can use."
        />
      ) : null}
      <Row gap={12} wrap>
        <Button
          kind="primary"
          label={kind === 'question' ? 'Ask' : 'Send the critique'}
          submit
          busy={busy}
          busyLabel="Sending"
        />
        <Button label="Leave it" onPress={onDone} />
      </Row>
    </Form>
  );
}
