import { useState } from 'react';
import { type Part, type PlanDocument } from '../../shared/plan/document';
import { Figure, type FigureParts } from '../ui/figure';
import { Heading } from '../ui/heading';
import { Row } from '../ui/layout';
import { Table, type Column } from '../ui/table';
import { PartMark } from '../ui/tag';
import { Text } from '../ui/text';
import { PartElevation } from './part-elevation';
import { type PlanValues } from './plan-model';

/** Length, width and thickness of a part, as worked out. */
function sizesOf(part: Part, values: PlanValues): (FigureParts | null)[] {
  const state = values.model.parts.get(part.id);
  return [state?.length, state?.width, state?.thickness].map((size) =>
    values.length(size?.value?.x),
  );
}

/** A part's length, width and thickness in a line. */
export function PartSize({ part, values }: { part: Part; values: PlanValues }) {
  return <Size figures={sizesOf(part, values)} />;
}

function Size({ figures }: { figures: (FigureParts | null)[] }) {
  const known = figures.filter((f): f is FigureParts => f !== null);
  return (
    <Text size="note">
      {known.map((figure, i) => (
        <Text key={i}>
          {i > 0 ? ' × ' : ''}
          <Figure figure={figure} withoutUnit />
        </Text>
      ))}
    </Text>
  );
}

/** A part's size, and the maker's below it where it differs. */
function Sizes({ part, values, maker }: { part: Part; values: PlanValues; maker: PlanValues }) {
  const own = values.model.parts.get(part.id);
  const before = maker.model.parts.get(part.id);
  const differs = (['length', 'width', 'thickness'] as const).some(
    (side) => Math.abs((own?.[side].value?.x ?? 0) - (before?.[side].value?.x ?? 0)) > 0.005,
  );
  return (
    <>
      <Size figures={sizesOf(part, values)} />
      {differs ? (
        <Text size="small" tone="ink2">
          maker’s <Size figures={sizesOf(part, maker)} />
        </Text>
      ) : null}
    </>
  );
}

/** The cut list: mark, name, size, how many, of what. */
export function PartsTable({
  document,
  values,
  maker = values,
}: {
  document: PlanDocument;
  values: PlanValues;
  /** The maker's own build, to mark what differs. */
  maker?: PlanValues;
}) {
  const [open, setOpen] = useState<string | null>(null);
  const columns: Column<Part>[] = [
    {
      key: 'part',
      title: 'Part',
      cell: (part) => (
        <Row gap={8} align="center">
          <PartMark letter={part.mark} />
          <Text size="note">
            {part.name}
            {part.role === 'part' ? '' : ` (${part.role.replace('-', ' ')})`}
          </Text>
        </Row>
      ),
    },
    {
      key: 'size',
      title: 'Size',
      unit: values.preference.system,
      align: 'right',
      cell: (part) => <Sizes part={part} values={values} maker={maker} />,
    },
    {
      key: 'of',
      title: 'Of',
      cell: (part) => document.stock.find((s) => s.id === part.stockId)?.name ?? '',
    },
    {
      key: 'count',
      title: 'No.',
      align: 'right',
      cell: (part) => <Figure figure={{ whole: part.quantity }} size="note" />,
    },
  ];
  const chosen = document.parts.find((part) => part.id === open);
  return (
    <>
      <Table
        label="Cut list"
        columns={columns}
        rows={document.parts}
        rowKey={(part) => part.id}
        rowState={(part) => (part.id === open ? 'chosen' : undefined)}
        onRowPress={(part) => setOpen(part.id === open ? null : part.id)}
        rowLabel={(part) => `Part ${part.mark}, ${part.name}: show its drawing`}
      />
      {chosen ? (
        <>
          <Heading level={3}>
            {chosen.mark} {chosen.name}
          </Heading>
          <PartElevation part={chosen} values={values} />
        </>
      ) : null}
    </>
  );
}
