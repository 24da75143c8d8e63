import { useState, type ReactNode } from 'react';
import { Icon } from '../ui/icon';
import { colour, line } from '../ui/tokens';

const kind = 'text/x-scantling-step';

/** What a step is dragged by; buttons and keys do the same. */
export function DragHandle({ id, label }: { id: string; label: string }) {
  return (
    <span
      draggable
      title={label}
      aria-hidden
      style={{ cursor: 'grab', display: 'inline-flex', padding: 8 }}
      onDragStart={(event) => {
        event.dataTransfer.setData(kind, id);
        event.dataTransfer.effectAllowed = 'move';
      }}
    >
      <Icon name="hand" size={20} />
    </span>
  );
}

/** Where a dragged step can be dropped: it takes this place. */
export function DropPlace({
  onDrop,
  onMove,
  children,
}: {
  onDrop: (id: string) => void;
  /** Alt with up and down, from anywhere in the row. */
  onMove: (by: -1 | 1) => void;
  children: ReactNode;
}) {
  const [over, setOver] = useState(false);
  return (
    <div
      style={{ borderTop: `${line.thick}px solid ${over ? colour.blue : 'transparent'}` }}
      onKeyDown={(event) => {
        const by = event.key === 'ArrowUp' ? -1 : event.key === 'ArrowDown' ? 1 : 0;
        if (!event.altKey || by === 0) return;
        event.preventDefault();
        onMove(by);
      }}
      onDragOver={(event) => {
        if (!event.dataTransfer.types.includes(kind)) return;
        event.preventDefault();
        setOver(true);
      }}
      onDragLeave={() => setOver(false)}
      onDrop={(event) => {
        setOver(false);
        const id = event.dataTransfer.getData(kind);
        if (id) onDrop(id);
      }}
    >
      {children}
    </div>
  );
}
