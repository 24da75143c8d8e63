import { v7 as uuid } from 'uuid';
import { applyMend, checkSheet, mendLabel, type SheetRow } from '../../shared/plan/sheet';
import { type PlanModel } from '../../shared/plan/model';
import { type PlanDocument } from '../../shared/plan/document';
import { useMemo } from 'react';
import { Button } from '../ui/button';
import { Heading } from '../ui/heading';
import { Row, Rule, Stack } from '../ui/layout';
import { PressArea } from '../ui/pressable';
import { Text } from '../ui/text';
import { VerdictShape, verdictKind, Verdict } from '../ui/verdict';

export interface SheetPaneProps {
  document: PlanDocument;
  model: PlanModel;
  /** Leads to the place a row speaks of. */
  onPlace: (row: SheetRow) => void;
  /** Changes the plan, for rows that can be mended in one tap. */
  onChange?: (change: (document: PlanDocument) => PlanDocument) => void;
}

/** The check sheet, live beside the work; each row leads to its place. */
export function SheetPane({ document, model, onPlace, onChange }: SheetPaneProps) {
  const sheet = useMemo(() => checkSheet(document, model), [document, model]);
  return (
    <Stack gap={12}>
      <Heading level={2} note={`${sheet.rows.length}`}>
        Check sheet
      </Heading>
      {sheet.rows.map((row, i) => (
        <Stack key={`${row.rule}-${row.place.elementId ?? ''}-${i}`} gap={8}>
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
          {row.mends && onChange ? (
            <Row gap={8} wrap>
              {row.mends.map((mend) => (
                <Button
                  key={mendLabel(mend, document)}
                  size="small"
                  label={mendLabel(mend, document)}
                  onPress={() => onChange((d) => applyMend(d, mend, uuid()))}
                />
              ))}
            </Row>
          ) : null}
          <Rule />
        </Stack>
      ))}
      <Verdict kind="holds" word={`${sheet.quiet} rules hold`} />
    </Stack>
  );
}
