import { useMemo } from 'react';
import { type PlanDocument } from '../../shared/plan/document';
import { type SheetRow } from '../../shared/plan/sheet';
import { PartElevation } from '../plans/part-elevation';
import { PartSize } from '../plans/parts-table';
import { valuesOf } from '../plans/plan-model';
import { BesideSheet } from './beside-sheet';
import { draftPreference } from './dimensions/facts';
import { ListEditor } from './fields/list-editor';
import {
  consumableFields,
  creditFields,
  hardwareFields,
  linkFields,
  stockFields,
  toolFields,
} from './fields/materials';
import { partFields } from './fields/parts';
import { type DraftEditor } from './use-draft-editor';

export interface ListsTabProps {
  editor: DraftEditor;
  /** The element a row of the sheet led to; it is open at first. */
  start: string | null;
  onPlace: (row: SheetRow) => void;
}

type EditedList = 'consumables' | 'credits' | 'parts' | 'stock' | 'hardware' | 'tools' | 'links';

/** A list of the plan as the list editor wants it. */
const listOf = <K extends EditedList>({ editor, start }: ListsTabProps, key: K) => ({
  start,
  items: editor.document[key],
  onChange: (fn: (items: PlanDocument[K]) => PlanDocument[K]) =>
    editor.change((d) => ({ ...d, [key]: fn(d[key]) })),
});

/** What the build is made of; each part with its size as worked out, an open one with its drawing. */
export function PartsTab(props: ListsTabProps) {
  const { document, model } = props.editor;
  const values = useMemo(
    () => valuesOf(model, draftPreference(document.units)),
    [model, document.units],
  );
  return (
    <BesideSheet label="Parts and stock" {...props}>
      <ListEditor
        title="Parts"
        fields={partFields(document)}
        {...listOf(props, 'parts')}
        below={(part, open) =>
          open ? (
            <PartElevation part={part} values={values} />
          ) : (
            <PartSize part={part} values={values} />
          )
        }
      />
      <ListEditor title="Stock" fields={stockFields(document)} {...listOf(props, 'stock')} />
      <ListEditor
        title="Hardware"
        fields={hardwareFields(document)}
        {...listOf(props, 'hardware')}
      />
      <ListEditor
        title="Glue, finish, abrasives"
        fields={consumableFields}
        {...listOf(props, 'consumables')}
      />
    </BesideSheet>
  );
}

/** What it is made with, where else the plan leads, whose work it builds on. */
export function ToolsTab(props: ListsTabProps) {
  const { document } = props.editor;
  return (
    <BesideSheet label="Tools and links" {...props}>
      <ListEditor title="Tools" fields={toolFields(document)} {...listOf(props, 'tools')} />
      <ListEditor title="Links" fields={linkFields} {...listOf(props, 'links')} />
      <ListEditor title="Credits" fields={creditFields} {...listOf(props, 'credits')} />
    </BesideSheet>
  );
}
