import { useState } from 'react';
import { limits } from '../../shared/api/limits';
import { type PlanDocument } from '../../shared/plan/document';
import { type SheetRow } from '../../shared/plan/sheet';
import { Button } from '../ui/button';
import { Fold } from '../ui/fold';
import { Row, Stack } from '../ui/layout';
import { Text } from '../ui/text';
import { LimitedField } from './fields/limited-field';

type ChangePlan = (change: (document: PlanDocument) => PlanDocument) => void;

export interface SwitchOffProps {
  row: Pick<SheetRow, 'rule' | 'place'>;
  onChange: ChangePlan;
}

/** Switches a rule that is no must off for one element, with the reason the plan keeps. */
export function SwitchOff({ row, onChange }: SwitchOffProps) {
  const [reason, setReason] = useState<string | null>(null);
  if (reason === null)
    return (
      <Row>
        <Button
          size="small"
          kind="quiet"
          label={`Switch ${row.rule} off here`}
          onPress={() => setReason('')}
        >
          Switch off here
        </Button>
      </Row>
    );
  const given = reason.trim() !== '';
  return (
    <Stack gap={8}>
      <LimitedField
        area
        autoFocus
        label="Why it does not count here"
        most={limits.note}
        value={reason}
        onChange={setReason}
      />
      <Row gap={8}>
        <Button
          size="small"
          label="Switch it off"
          disabled={!given}
          onPress={() =>
            onChange((d) => ({
              ...d,
              switchedOff: [
                ...d.switchedOff,
                {
                  rule: row.rule,
                  reason: reason.trim(),
                  ...(row.place.elementId === null ? {} : { elementId: row.place.elementId }),
                },
              ],
            }))
          }
        />
        <Button size="small" kind="quiet" label="Leave it on" onPress={() => setReason(null)} />
      </Row>
    </Stack>
  );
}

export interface SwitchedOffProps {
  document: PlanDocument;
  onChange: ChangePlan;
}

/** The rules that are off, each with its reason and the way back. */
export function SwitchedOff({ document, onChange }: SwitchedOffProps) {
  const { switchedOff } = document;
  if (switchedOff.length === 0) return null;
  return (
    <Fold title="Switched off" note={String(switchedOff.length)}>
      {switchedOff.map((off) => (
        <Row key={`${off.rule} ${off.elementId ?? ''}`} gap={12} align="flex-start">
          <Stack gap={4} style={{ flex: 1 }}>
            <Text size="small" mono>
              {off.rule}
            </Text>
            <Text size="note">{off.reason}</Text>
          </Stack>
          <Button
            size="small"
            kind="quiet"
            label={`Switch ${off.rule} on`}
            onPress={() =>
              onChange((d) => ({
                ...d,
                switchedOff: d.switchedOff.filter(
                  (x) => x.rule !== off.rule || x.elementId !== off.elementId,
                ),
              }))
            }
          >
            Switch on
          </Button>
        </Row>
      ))}
    </Fold>
  );
}
