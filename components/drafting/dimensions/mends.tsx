import { nearest } from '../../../shared/measure';
import { type PlanDocument } from '../../../shared/plan/document';
import { type ModelFault } from '../../../shared/plan/model';
import { Button } from '../../ui/button';
import { faultSpan } from './completion';

export interface MendsProps {
  text: string;
  fault: ModelFault;
  document: PlanDocument;
  onText: (text: string) => void;
  /** Adds a given dimension of this symbol. */
  onAdd: (symbol: string) => void;
}

/** For a name that nothing has: the nearest that there is, or a new dimension of that name. */
export function Mends({ text, fault, document, onText, onAdd }: MendsProps) {
  if (fault.code !== 'unknown-symbol') return null;
  const [from, to] = faultSpan(text, fault.at);
  const word = text.slice(from, to);
  const near = nearest(
    word,
    document.dimensions.map((d) => d.symbol),
  );
  return (
    <>
      {near ? (
        <Button
          size="small"
          label={`Use ${near}`}
          onPress={() => onText(text.slice(0, from) + near + text.slice(to))}
        />
      ) : null}
      <Button size="small" label={`Add ${word}`} onPress={() => onAdd(word)} />
    </>
  );
}
