import { memo, useDeferredValue, useMemo, useState } from 'react';
import { v7 as uuid } from 'uuid';
import { applyMend, checkSheet, mendLabel, type SheetRow } from '../../shared/plan/sheet';
import { type PlanModel } from '../../shared/plan/model';
import { type PlanDocument } from '../../shared/plan/document';
import { Button } from '../ui/button';
import { Heading } from '../ui/heading';
import { Row, Rule, Stack } from '../ui/layout';
import { PressArea } from '../ui/pressable';
import { Text } from '../ui/text';
import { VerdictShape, verdictKind, Verdict } from '../ui/verdict';
import { SwitchedOff, SwitchOff } from './switch-off';

export interface SheetPaneProps {
  model: PlanModel;
  /** Leads to the place a row speaks of. Keep it the same between renders. */
  onPlace: (row: SheetRow) => void;
  /** Changes the plan, for rows that can be mended in one tap. Keep it the same between renders. */
  onChange: (change: (document: PlanDocument) => PlanDocument) => void;
}

/** Rows shown at once; a sheet with more than these is worked down from the top anyway. */
const page = 30;

/** The check sheet beside the work, a moment behind the typing; each row leads to its place. */
export function SheetPane({ model, onPlace, onChange }: SheetPaneProps) {
  const worked = useDeferredValue(model);
  const sheet = useMemo(() => checkSheet(worked.document, worked), [worked]);
  const [most, setMost] = useState(page);
  const more = sheet.rows.length - most;
  return (
    <Stack gap={12}>
      <Heading level={2} note={`${sheet.rows.length}`}>
        Check sheet
      </Heading>
      {sheet.rows.slice(0, most).map((row, i) => (
        <SheetLine
          key={`${row.rule}-${row.place.elementId ?? ''}-${i}`}
          row={row}
          mends={row.mends?.map((mend) => mendLabel(mend, worked.document)).join('\n') ?? ''}
          onPlace={onPlace}
          onChange={onChange}
        />
      ))}
      {more > 0 ? (
        <Row>
          <Button
            label={more > page ? `Show ${page} more of ${more}` : `Show the other ${more}`}
            onPress={() => setMost(most + page)}
          />
        </Row>
      ) : null}
      <SwitchedOff document={worked.document} onChange={onChange} />
      <Verdict kind="holds" word={`${sheet.quiet} rules hold`} />
    </Stack>
  );
}

interface SheetLineProps extends Pick<SheetPaneProps, 'onPlace' | 'onChange'> {
  row: SheetRow;
  /** Labels of the row's mends, one a line. */
  mends: string;
}

/** A row is made new with every sheet; it is drawn again only when it says something else. */
const sameLine = (a: SheetLineProps, b: SheetLineProps) =>
  a.onPlace === b.onPlace &&
  a.onChange === b.onChange &&
  a.mends === b.mends &&
  JSON.stringify(a.row) === JSON.stringify(b.row);

const SheetLine = memo(function SheetLine({ row, mends, onPlace, onChange }: SheetLineProps) {
  const labels = mends.split('\n');
  return (
    <Stack gap={8}>
      <PressArea role="button" label={`${row.message} Go there`} onPress={() => onPlace(row)}>
        <Row gap={12} align="flex-start">
          <VerdictShape kind={verdictKind(row.verdict)} />
          <Stack gap={4} style={{ flex: 1 }}>
            <Text size="note" weight={600}>
              {row.message}
            </Text>
            <Text size="note">{row.cure}</Text>
            <Text size="small" mono tone="ink2">
              {row.rule}, {row.level}
            </Text>
          </Stack>
        </Row>
      </PressArea>
      {row.mends && row.mends.length > 0 ? (
        <Row gap={8} wrap>
          {row.mends.map((mend, i) => (
            <Button
              key={labels[i]}
              size="small"
              label={labels[i] ?? ''}
              onPress={() => onChange((d) => applyMend(d, mend, uuid()))}
            />
          ))}
        </Row>
      ) : null}
      {row.level === 'must' ? null : <SwitchOff row={row} onChange={onChange} />}
      <Rule />
    </Stack>
  );
}, sameLine);
