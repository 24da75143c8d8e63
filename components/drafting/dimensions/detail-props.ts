import { type Dimension } from '../../../shared/plan/document';
import { type DraftEditor } from '../use-draft-editor';

export interface DetailProps {
  dimension: Dimension;
  editor: DraftEditor;
  onChange: (dimension: Dimension) => void;
  onRemove: () => void;
  /** Leads to another dimension. */
  onChoose: (id: string) => void;
}
