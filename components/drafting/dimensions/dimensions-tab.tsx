import { useCallback, useMemo, useState } from 'react';
import { View } from 'react-native';
import { type Dimension, type Origin } from '../../../shared/plan/document';
import { type SheetRow } from '../../../shared/plan/sheet';
import { toast } from '../../ui/announcer';
import { Button } from '../../ui/button';
import { Row, Stack, WorkPanes } from '../../ui/layout';
import { EmptyState } from '../../ui/states';
import { Tag } from '../../ui/tag';
import { TextField } from '../../ui/text-field';
import { useWide } from '../../ui/use-media';
import { SheetPane } from '../sheet-pane';
import { type DraftEditor } from '../use-draft-editor';
import { replacedDimension, withNewDimension } from '../with-dimension';
import { Detail } from './detail';
import { DimensionsTable } from './dimensions-table';

export interface DimensionsTabProps {
  editor: DraftEditor;
  chosen: string | null;
  onChoose: (id: string | null) => void;
  /** Leads to a place that a row of the check sheet speaks of. */
  onPlace: (row: SheetRow) => void;
}

const origins = ['all', 'given', 'taken', 'derived'] as const;

/** The dimensions as a table, the one being worked on beside it, the check sheet under that. */
export function DimensionsTab({ editor, chosen, onChoose, onPlace }: DimensionsTabProps) {
  const { document, change } = editor;
  const wide = useWide();
  const [wanted, setWanted] = useState('');
  const [origin, setOrigin] = useState<'all' | Origin>('all');
  const shown = useMemo(
    () => document.dimensions.filter((d) => d.id === chosen || fits(d, wanted, origin)),
    [document.dimensions, wanted, origin, chosen],
  );
  const replace = useCallback(
    (next: Dimension) => change((d) => replacedDimension(d, next)),
    [change],
  );
  const remove = (gone: Dimension) => {
    const before = document.dimensions;
    change((d) => ({ ...d, dimensions: d.dimensions.filter((x) => x.id !== gone.id) }));
    onChoose(null);
    toast({
      text: `${gone.symbol} was taken out.`,
      action: {
        label: 'Put it back',
        onPress: () => change((d) => ({ ...d, dimensions: before })),
      },
    });
  };
  const add = () => {
    const next = withNewDimension(document);
    const made = next.dimensions[next.dimensions.length - 1];
    change((d) => (made ? { ...d, dimensions: [...d.dimensions, made] } : d));
    setWanted('');
    setOrigin('all');
    if (made) onChoose(made.id);
  };
  const dimension = document.dimensions.find((d) => d.id === chosen);
  const detail = dimension ? (
    <Detail
      dimension={dimension}
      editor={editor}
      onChange={replace}
      onRemove={() => remove(dimension)}
      onChoose={onChoose}
    />
  ) : null;
  return (
    <WorkPanes
      below={150}
      panes={[
        {
          key: 'table',
          label: 'Dimensions',
          content: (
            <Stack gap={12} style={{ padding: 4, paddingRight: 12 }}>
              <Toolbar {...{ wanted, setWanted, origin, setOrigin, add }} count={shown.length} />
              {document.dimensions.length === 0 ? (
                <EmptyState title="No dimension yet">
                  A dimension is a figure the plan depends on: given by you, taken by each builder,
                  or derived from others.
                </EmptyState>
              ) : (
                <DimensionsTable
                  editor={editor}
                  shown={shown}
                  chosen={chosen}
                  wide={wide}
                  onChoose={onChoose}
                  onChange={replace}
                  below={wide ? null : detail}
                />
              )}
            </Stack>
          ),
        },
        {
          key: 'beside',
          label: 'The dimension and the check sheet',
          width: 340,
          content: (
            <View style={{ padding: 4, paddingHorizontal: 12, gap: 24 }}>
              {wide ? detail : null}
              <SheetPane model={editor.model} onPlace={onPlace} onChange={change} />
            </View>
          ),
        },
      ]}
    />
  );
}

function fits(d: Dimension, wanted: string, origin: 'all' | Origin): boolean {
  if (origin !== 'all' && d.origin !== origin) return false;
  const word = wanted.trim().toLowerCase();
  return (
    word === '' ||
    d.symbol.toLowerCase().includes(word) ||
    d.name.toLowerCase().includes(word) ||
    d.expression.toLowerCase().includes(word)
  );
}

interface ToolbarProps {
  wanted: string;
  setWanted: (text: string) => void;
  origin: 'all' | Origin;
  setOrigin: (origin: 'all' | Origin) => void;
  add: () => void;
  count: number;
}

function Toolbar({ wanted, setWanted, origin, setOrigin, add, count }: ToolbarProps) {
  return (
    <Row gap={12} wrap align="center">
      <View style={{ flexGrow: 1, flexBasis: 200 }}>
        <TextField
          label="Find a dimension"
          hideLabel
          type="search"
          placeholder="Find a dimension"
          value={wanted}
          onChange={setWanted}
        />
      </View>
      <View role="group" aria-label="Origin" style={{ flexDirection: 'row', gap: 8 }}>
        {origins.map((value) => (
          <Tag
            key={value}
            label={value === origin ? `${value} ${count}` : value}
            kind={value === origin ? 'on' : 'plain'}
            onPress={() => setOrigin(value)}
          />
        ))}
      </View>
      <Button icon="add" label="Add a dimension" onPress={add}>
        Dimension
      </Button>
    </Row>
  );
}
