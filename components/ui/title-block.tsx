import { type CSSProperties, type ReactNode } from 'react';
import { Text } from './text';
import { colour, line } from './tokens';

export interface TitleBlockCell {
  label: string;
  /** A string is set semibold; or a Figure, Verdict, several Texts. */
  value: ReactNode;
  /** Share of the row; default 1. */
  share?: number;
  /** Running words instead of a value: set plain. */
  prose?: boolean;
}

/** The drawing's title block: framed cells, a label above each value. */
export function TitleBlock({
  label,
  rows,
}: {
  label: string;
  rows: readonly (readonly TitleBlockCell[])[];
}) {
  return (
    <div role="group" aria-label={label} style={frame}>
      {rows.map((cells, r) => (
        <dl key={r} style={{ ...row, borderTop: r ? `${line.thin}px solid ${colour.ink}` : 0 }}>
          {cells.map((cell, c) => (
            <Cell key={cell.label} cell={cell} divided={c > 0} />
          ))}
        </dl>
      ))}
    </div>
  );
}

function Cell({ cell, divided }: { cell: TitleBlockCell; divided: boolean }) {
  const own: CSSProperties = {
    flex: `${cell.share ?? 1} 1 0`,
    minWidth: 0,
    padding: '6px 10px 8px',
    borderLeft: divided ? `${line.thin}px solid ${colour.ink}` : 0,
  };
  const plain = typeof cell.value === 'string' || typeof cell.value === 'number';
  return (
    <div style={own}>
      <dt>
        <Text size="small" tone="ink2">
          {cell.label}
        </Text>
      </dt>
      <dd style={{ margin: 0 }}>
        {plain ? (
          <Text size={cell.prose ? 'note' : 'body'} weight={cell.prose ? 400 : 600}>
            {cell.value}
          </Text>
        ) : (
          cell.value
        )}
      </dd>
    </div>
  );
}

const frame: CSSProperties = {
  margin: 0,
  alignSelf: 'stretch',
  display: 'flex',
  flexDirection: 'column',
  border: `${line.medium}px solid ${colour.ink}`,
  background: colour.sheet,
};
const row: CSSProperties = { margin: 0, display: 'flex', flexDirection: 'row' };
