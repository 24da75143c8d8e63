import { type Check } from '../../shared/plan/document';
import { type SheetRow } from '../../shared/plan/sheet';
import { BesideSheet } from './beside-sheet';
import { CheckSaid } from './check-said';
import { checkFields } from './fields/dimensions';
import { ListEditor } from './fields/list-editor';
import { type DraftEditor } from './use-draft-editor';

export interface ChecksTabProps {
  editor: DraftEditor;
  /** The check a row of the sheet led to. */
  start: string | null;
  onPlace: (row: SheetRow) => void;
}

/** The plan's own checks with what would make each hold; the check sheet beside them. */
export function ChecksTab({ editor, start, onPlace }: ChecksTabProps) {
  const { document, change, model } = editor;
  const said = (check: Check) => {
    const state = model.checks.get(check.id);
    return state ? <CheckSaid state={state} editor={editor} /> : null;
  };
  return (
    <BesideSheet label="Checks" editor={editor} onPlace={onPlace}>
      <ListEditor
        title="Checks"
        fields={checkFields(model)}
        items={document.checks}
        onChange={(fn) => change((d) => ({ ...d, checks: fn(d.checks) }))}
        start={start}
        below={said}
      />
    </BesideSheet>
  );
}
