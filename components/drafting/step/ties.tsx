import { View } from 'react-native';
import { type PlanDocument, type Step } from '../../../shared/plan/document';
import { Button } from '../../ui/button';
import { Row, Stack } from '../../ui/layout';
import { Select } from '../../ui/select';
import { Text } from '../../ui/text';
import { type StepListProps } from './step-lists';

type IdList = 'takes' | 'holds' | 'checks' | 'toolIds' | 'after';

interface TiedProps extends StepListProps {
  list: IdList;
  title: string;
  /** Words of the choice that adds one. */
  add: string;
  from: readonly { value: string; label: string }[];
}

/** Things of the plan a step names in one of its lists: each can be taken out, others added. */
function Tied({ step, onChange, list, title, add, from }: TiedProps) {
  const tied = step[list].flatMap((id) => from.find((x) => x.value === id) ?? []);
  const rest = from.filter((x) => !step[list].includes(x.value));
  if (from.length === 0) return null;
  return (
    <Stack gap={8}>
      <Text size="note" weight={600}>
        {title}
      </Text>
      {tied.length > 0 ? (
        <View role="list" aria-label={title} style={{ gap: 4 }}>
          {tied.map(({ value, label }) => (
            <View key={value} role="listitem">
              <Row gap={8} justify="space-between">
                <Text style={{ flex: 1 }}>{label}</Text>
                <Button
                  size="small"
                  kind="quiet"
                  label={`Not here: ${label}`}
                  onPress={() =>
                    onChange((s) => ({ ...s, [list]: s[list].filter((id) => id !== value) }))
                  }
                >
                  Not here
                </Button>
              </Row>
            </View>
          ))}
        </View>
      ) : null}
      {rest.length > 0 ? (
        <Select
          key={step[list].length}
          label={add}
          hideLabel
          small
          placeholder={add}
          options={rest}
          value=""
          onChange={(id) => onChange((s) => ({ ...s, [list]: [...s[list], id] }))}
        />
      ) : null}
    </Stack>
  );
}

export interface TiesProps extends StepListProps {
  document: PlanDocument;
}

/** The dimensions a step has taken or held, and the checks it asks. */
export function Figures({ document, ...props }: TiesProps) {
  const dimensions = (taken: boolean) =>
    document.dimensions
      .filter((d) => (d.origin === 'taken') === taken)
      .map((d) => ({ value: d.id, label: `${d.symbol}, ${d.name}` }));
  const checks = document.checks.map((c) => ({ value: c.id, label: c.name }));
  return (
    <>
      <Tied
        {...props}
        list="takes"
        title="Taken here"
        add="Take a dimension here"
        from={dimensions(true)}
      />
      <Tied
        {...props}
        list="holds"
        title="Held here"
        add="Hold a dimension here"
        from={dimensions(false)}
      />
      <Tied {...props} list="checks" title="Checked here" add="Ask a check here" from={checks} />
    </>
  );
}

const stages = ['roughed', 'sized', 'shaped', 'used'] as const;
type Stage = Step['parts'][number]['to'];

/** What the step does to parts, with which tools, after which steps. */
export function PartsAndTools({ document, step, onChange }: TiesProps) {
  const here = step.parts.flatMap(({ partId, to }) => {
    const part = document.parts.find((p) => p.id === partId);
    return part ? [{ part, to }] : [];
  });
  const rest = document.parts.filter((p) => !step.parts.some((x) => x.partId === p.id));
  const put = (partId: string, to: Stage | null) =>
    onChange((s) => ({
      ...s,
      parts:
        to === null
          ? s.parts.filter((p) => p.partId !== partId)
          : s.parts.some((p) => p.partId === partId)
            ? s.parts.map((p) => (p.partId === partId ? { partId, to } : p))
            : [...s.parts, { partId, to }],
    }));
  return (
    <>
      {here.map(({ part, to }) => (
        <Row key={part.id} gap={8} align="flex-end" justify="space-between">
          <View style={{ flex: 1 }}>
            <Select
              label={`Part ${part.mark}, ${part.name}, is`}
              small
              options={stages.map((value) => ({ value, label: value }))}
              value={to}
              onChange={(next) => put(part.id, next)}
            />
          </View>
          <Button
            size="small"
            kind="quiet"
            label={`Not here: part ${part.mark}`}
            onPress={() => put(part.id, null)}
          >
            Not here
          </Button>
        </Row>
      ))}
      {rest.length > 0 ? (
        <Select
          key={step.parts.length}
          label="Work on a part here"
          hideLabel
          small
          placeholder="Work on a part here"
          options={rest.map((p) => ({ value: p.id, label: `${p.mark}, ${p.name}` }))}
          value=""
          onChange={(id) => put(id, 'sized')}
        />
      ) : null}
      <Tied
        step={step}
        onChange={onChange}
        list="toolIds"
        title="Tools in this step"
        add="Use a tool here"
        from={document.tools.map((t) => ({ value: t.id, label: t.name }))}
      />
    </>
  );
}

/** Steps that must be done before this one, where the order of the plan does not say it. */
export function AfterSteps({ document, step, onChange }: TiesProps) {
  return (
    <Tied
      step={step}
      onChange={onChange}
      list="after"
      title="Waits for steps"
      add="Wait for a step"
      from={document.steps.flatMap((s, i) =>
        s.id === step.id ? [] : [{ value: s.id, label: `${i + 1}. ${s.title}` }],
      )}
    />
  );
}
