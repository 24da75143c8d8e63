import { useState } from 'react';
import { limits } from '../../shared/api/limits';
import { tell } from '../data/problems';
import { Banner } from '../ui/banner';
import { Button } from '../ui/button';
import { Form } from '../ui/form';
import { Row } from '../ui/layout';
import { TextArea } from '../ui/text-field';

export interface TextFormProps {
  label: string;
  fieldLabel: string;
  sendLabel: string;
  start?: string;
  submit: (text: string) => Promise<unknown>;
  onDone: () => void;
}

/** One field of words: an answer, or one's own words again. */
export function TextForm({
  label,
  fieldLabel,
  sendLabel,
  start = '',
  submit,
  onDone,
}: TextFormProps) {
  const [text, setText] = useState(start);
  const [fault, setFault] = useState<string | undefined>();
  const [trouble, setTrouble] = useState<string | null>(null);
  const [busy, setBusy] = useState(false);
  const send = async () => {
    setFault(text.trim() === '' ? 'Say something first.' : undefined);
    if (text.trim() === '') return;
    setBusy(true);
    setTrouble(null);
    try {
      await submit(text);
      onDone();
    } catch (error) {
      setTrouble(`${tell(error).text} Your words are still here.`);
    } finally {
      setBusy(false);
    }
  };
  return (
    <Form label={label} onSubmit={() => void send()}>
      {trouble ? <Banner kind="fails">{trouble}</Banner> : null}
      <TextArea
        label={fieldLabel}
        value={text}
        onChange={setText}
        limit={limits.commentText}
        error={fault}
      />
      <Row gap={12} wrap>
        <Button kind="primary" label={sendLabel} submit busy={busy} busyLabel="Sending" />
        <Button label="Leave it" onPress={onDone} />
      </Row>
    </Form>
  );
}
