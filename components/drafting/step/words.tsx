import { useRef } from 'react';
import { limits } from '../../../shared/api/limits';
import { type PlanDocument, type Step } from '../../../shared/plan/document';
import { looseNames, shownText, storedText } from '../../../shared/plan/references';
import { Select } from '../../ui/select';
import { TextArea } from '../../ui/text-field';

export interface WordsProps {
  step: Step;
  document: PlanDocument;
  onChange: (change: (step: Step) => Step) => void;
}

/** What to do, with references shown by symbol and mark, and a list that puts one in where the caret is. */
export function Words({ step, document, onChange }: WordsProps) {
  const caret = useRef<number | null>(null);
  const text = shownText(step.text, document);
  const loose = looseNames(storedText(text, document));
  const put = (words: string) => {
    const stored = storedText(words, document);
    // A text that is too long is not cut: what was there stays, and the counter says how much is over.
    if (stored.length <= limits.stepText || stored.length < step.text.length)
      onChange((s) => ({ ...s, text: stored }));
  };
  const insert = (reference: string) => {
    const at = caret.current ?? text.length;
    const before = text.slice(0, at);
    const gap = before === '' || /\s$/.test(before) ? '' : ' ';
    put(`${before}${gap}{{${reference}}}${text.slice(at)}`);
    caret.current = at + gap.length + reference.length + 4;
  };
  return (
    <>
      <TextArea
        label="What to do"
        value={text}
        onChange={put}
        onSelectionChange={(event) => {
          caret.current = event.nativeEvent.selection.start;
        }}
        limit={limits.stepText}
        help="Markdown. Figures and parts go in by the list below, so that they follow the plan."
        error={loose.length > 0 ? `Nothing is called ${loose.join(', ')}.` : undefined}
      />
      {document.dimensions.length + document.parts.length > 0 ? (
        <Select
          key={step.text.length}
          label="Put a figure or a part into the text"
          hideLabel
          small
          placeholder="Put a figure or a part into the text"
          options={[
            ...document.dimensions.map((d) => ({
              value: d.symbol,
              label: `${d.symbol}, ${d.name}`,
            })),
            ...document.parts.map((p) => ({
              value: `part ${p.mark}`,
              label: `part ${p.mark}, ${p.name}`,
            })),
          ]}
          value=""
          onChange={insert}
        />
      ) : null}
    </>
  );
}
