import { useState } from 'react';
import { type ModelReadings } from '../../shared/plan/model';
import { toExact } from '../../shared/measure';
import { type PlanDocument } from '../../shared/plan/document';
import { useOwnFigures } from '../data/own-figures';
import { Button } from '../ui/button';
import { Form } from '../ui/form';
import { Heading } from '../ui/heading';
import { Row, Section } from '../ui/layout';
import { Text } from '../ui/text';
import { NumberFigureField } from '../ui/text-field';
import { type PlanValues } from './plan-model';

/** Typed figures as readings of the taken dimensions; what cannot be read is left out. */
export function readingsOf(
  document: PlanDocument,
  typed: Readonly<Record<string, string>>,
  unit: 'mm' | 'in',
): ModelReadings | undefined {
  const readings = new Map(
    document.dimensions.flatMap((d) => {
      const text = d.origin === 'taken' ? typed[d.id] : undefined;
      const read = text ? toExact(text, unit) : null;
      return read?.ok ? [[d.id, [{ value: read.value, instrument: d.instrument }]] as const] : [];
    }),
  );
  return readings.size > 0 ? { readings } : undefined;
}

/** What differs from the maker's own build once the reader's figures are in. */
export function changedFrom(own: PlanValues, maker: PlanValues): ReadonlySet<string> {
  const changed = new Set<string>();
  for (const [id, state] of own.model.dimensions) {
    const before = maker.model.dimensions.get(id)?.value?.x;
    if (before !== undefined && state.value && Math.abs(state.value.x - before) > 0.005)
      changed.add(id);
  }
  return changed;
}

export interface OwnMachineProps {
  planId: string;
  document: PlanDocument;
  values: PlanValues;
  /** How many figures differ from the maker's. */
  changed: number;
}

/** The taken dimensions as a short form; everything on the page follows. Kept in this browser. */
export function OwnMachine({ planId, document, values, changed }: OwnMachineProps) {
  const taken = document.dimensions.filter((d) => d.origin === 'taken');
  const { typed, keep, clear } = useOwnFigures(planId);
  const [draft, setDraft] = useState(typed);
  const [faults, setFaults] = useState<Record<string, string>>({});
  if (taken.length === 0) return null;
  const unit = values.preference.system;
  const use = () => {
    const found: Record<string, string> = {};
    const kept: Record<string, string> = {};
    for (const d of taken) {
      const text = draft[d.id]?.trim() ?? '';
      const read = text === '' ? null : toExact(text, unit);
      // A bare figure keeps its unit, so that switching units later does not change it.
      if (read?.ok) kept[d.id] = /[a-z"'′″]/i.test(text) ? text : `${text} ${unit}`;
      if (read && !read.ok) found[d.id] = `${read.message} ${read.cure ?? ''}`.trim();
    }
    setFaults(found);
    if (Object.keys(found).length === 0) keep(kept);
  };
  return (
    <Section>
      <Heading level={2} note={changed > 0 ? `${changed} figures differ` : undefined}>
        On your machine
      </Heading>
      <Text tone="ink2">
        Read these in your shop and the parts, steps and checks below follow. Nothing is sent
        anywhere.
      </Text>
      <Form label="On your machine" onSubmit={use}>
        {taken.map((d) => {
          const figure = values.figure(d.id);
          return (
            <NumberFigureField
              key={d.id}
              label={d.name}
              unit={unit}
              value={draft[d.id] ?? ''}
              onChange={(text) => setDraft({ ...draft, [d.id]: text })}
              help={
                d.where ||
                (figure && !typed[d.id]
                  ? 'The maker’s own figure counts until you give yours.'
                  : undefined)
              }
              error={faults[d.id]}
            />
          );
        })}
        <Row gap={12} wrap>
          <Button kind="primary" label="Use my figures" submit />
          {Object.keys(typed).length > 0 ? (
            <Button
              label="Back to the maker’s"
              onPress={() => {
                setDraft({});
                setFaults({});
                clear();
              }}
            />
          ) : null}
        </Row>
      </Form>
    </Section>
  );
}
