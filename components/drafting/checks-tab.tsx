import { View } from 'react-native';
import { type Check } from '../../shared/plan/document';
import { type SheetRow } from '../../shared/plan/sheet';
import { WorkPanes } from '../ui/layout';
import { CheckSaid } from './check-said';
import { checkFields } from './list-fields';
import { ListEditor } from './list-editor';
import { SheetPane } from './sheet-pane';
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
    <WorkPanes
      below={150}
      panes={[
        {
          key: 'checks',
          label: 'Checks',
          content: (
            <View style={{ padding: 4, paddingRight: 12 }}>
              <ListEditor
                title="Checks"
                fields={checkFields(model)}
                items={document.checks}
                onChange={(checks) => change((d) => ({ ...d, checks }))}
                start={start}
                below={said}
              />
            </View>
          ),
        },
        {
          key: 'sheet',
          label: 'Check sheet',
          width: 340,
          content: (
            <View style={{ padding: 4, paddingHorizontal: 12 }}>
              <SheetPane model={model} onPlace={onPlace} onChange={change} />
            </View>
          ),
        },
      ]}
    />
  );
}
