import { type ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { PressArea } from './pressable';
import { Text } from './text';
import { colour, line } from './tokens';
import { webStyle } from './web-style';

export interface Column<R> {
  key: string;
  /** Head of the column; the unit stands here, once. */
  title: string;
  unit?: string;
  /** Figures stand at the right, so their points align. */
  align?: 'left' | 'right';
  /** CSS grid track; default `max-content` for figures, the rest shared for words. */
  width?: string;
  /** A string is set as text; figures as `<Figure … withoutUnit />`. */
  cell: (row: R) => ReactNode;
}

export interface TableProps<R> {
  /** Accessible name. */
  label: string;
  columns: readonly Column<R>[];
  rows: readonly R[];
  rowKey: (row: R) => string;
  /** The row that is chosen; failing rows get the red edge. */
  rowState?: (row: R) => 'chosen' | 'fails' | 'quiet' | undefined;
  /** The row can be opened or chosen: its first cell becomes the button named by `rowLabel`. */
  onRowPress?: (row: R) => void;
  rowLabel?: (row: R) => string;
  /** Stacked rows on a phone (default); false keeps columns, for narrow tables. */
  stack?: boolean;
}

/** A table with thin rules, one unit per column, figures at the right. */
export function Table<R>(props: TableProps<R>) {
  const { label, columns, rows, rowKey, stack = true } = props;
  const tracks = columns
    .map((c) => c.width ?? (c.align === 'right' ? 'max-content' : 'minmax(0, 1fr)'))
    .join(' ');
  return (
    <View
      role="table"
      aria-label={label}
      dataSet={{ table: stack ? 'stack' : 'columns' }}
      style={[styles.table, webStyle({ gridTemplateColumns: tracks })]}
    >
      <View role="rowgroup" style={styles.group} dataSet={{ part: 'head' }}>
        <View role="row" style={[styles.row, styles.headRow]}>
          {columns.map((c, i) => (
            <View key={c.key} role="columnheader" style={[styles.cell, i > 0 && styles.apart]}>
              <Text size="small" tone="ink2" align={c.align}>
                {headOf(c)}
              </Text>
            </View>
          ))}
        </View>
      </View>
      <View role="rowgroup" style={styles.group} dataSet={{ part: 'body' }}>
        {rows.map((row) => (
          <TableRow key={rowKey(row)} {...props} row={row} />
        ))}
      </View>
    </View>
  );
}

const headOf = <R,>(c: Column<R>) => (c.unit ? `${c.title}, ${c.unit}` : c.title);

function TableRow<R>({ row, columns, rowState, onRowPress, rowLabel }: TableProps<R> & { row: R }) {
  const state = rowState?.(row);
  return (
    <View
      role="row"
      aria-current={state === 'chosen' ? 'true' : undefined}
      dataSet={{ part: 'row', press: onRowPress ? 'yes' : undefined }}
      style={[styles.row, state && rowStyles[state]]}
      onClick={onRowPress ? () => onRowPress(row) : undefined}
    >
      {columns.map((c, i) => (
        <View
          key={c.key}
          role={i === 0 ? 'rowheader' : 'cell'}
          dataSet={{ part: 'cell', first: i === 0 ? 'yes' : undefined }}
          style={[styles.cell, i > 0 && styles.apart, c.align === 'right' && styles.right]}
        >
          {i > 0 ? (
            <View dataSet={{ part: 'label' }} aria-hidden>
              <Text size="small" tone="ink2">
                {headOf(c)}
              </Text>
            </View>
          ) : null}
          {i === 0 && onRowPress ? (
            <PressArea
              role="button"
              label={rowLabel?.(row) ?? 'Open'}
              onClick={(event) => event.stopPropagation()}
              onPress={() => onRowPress(row)}
            >
              <CellContent content={c.cell(row)} quiet={state === 'quiet'} />
            </PressArea>
          ) : (
            <CellContent content={c.cell(row)} quiet={state === 'quiet'} align={c.align} />
          )}
        </View>
      ))}
    </View>
  );
}

function CellContent({
  content,
  quiet,
  align,
}: {
  content: ReactNode;
  quiet: boolean;
  align?: 'left' | 'right';
}) {
  if (typeof content !== 'string' && typeof content !== 'number') return content;
  return (
    <Text size="note" tone={quiet ? 'ink3' : 'ink'} align={align}>
      {content}
    </Text>
  );
}

const spanAll = { display: 'grid', gridColumn: '1 / -1', gridTemplateColumns: 'subgrid' } as const;

const styles = StyleSheet.create({
  table: webStyle({ display: 'grid', alignSelf: 'stretch' }),
  group: webStyle(spanAll),
  row: webStyle({
    ...spanAll,
    alignItems: 'baseline',
    borderBottomWidth: line.thin,
    borderBottomStyle: 'solid',
    borderBottomColor: colour.ruleThin,
    paddingLeft: 8,
  }),
  headRow: { borderBottomWidth: line.medium, borderBottomColor: colour.ink },
  cell: { paddingTop: 7, paddingBottom: 7 },
  apart: { paddingLeft: 14 },
  right: { alignItems: 'flex-end' },
});

const rowStyles = StyleSheet.create({
  chosen: webStyle({
    backgroundColor: colour.blueWash,
    boxShadow: `inset 2.5px 0 0 ${colour.blue}`,
  }),
  fails: webStyle({ boxShadow: `inset 2.5px 0 0 ${colour.fails}` }),
  quiet: {},
});
