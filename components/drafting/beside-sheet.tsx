import { type ReactNode } from 'react';
import { View } from 'react-native';
import { type SheetRow } from '../../shared/plan/sheet';
import { WorkPanes } from '../ui/layout';
import { SheetPane } from './sheet-pane';
import { type DraftEditor } from './use-draft-editor';

export interface BesideSheetProps {
  /** Names the pane for those who cannot see it. */
  label: string;
  editor: DraftEditor;
  onPlace: (row: SheetRow) => void;
  children: ReactNode;
}

/** A part of the draft with the check sheet beside it. */
export function BesideSheet({ label, editor, onPlace, children }: BesideSheetProps) {
  return (
    <WorkPanes
      below={150}
      panes={[
        {
          key: 'work',
          label,
          content: <View style={{ padding: 4, paddingRight: 12, gap: 16 }}>{children}</View>,
        },
        {
          key: 'sheet',
          label: 'Check sheet',
          width: 340,
          content: (
            <View style={{ padding: 4, paddingHorizontal: 12 }}>
              <SheetPane model={editor.model} onPlace={onPlace} onChange={editor.change} />
            </View>
          ),
        },
      ]}
    />
  );
}
