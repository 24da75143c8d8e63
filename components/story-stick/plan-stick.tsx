import { type ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import Svg, { Path } from 'react-native-svg';
import { spreadShapes } from '../../shared/plan/stick/shapes';
import { clockTime } from '../../shared/plan/stick/spoken';
import { type StickStep } from '../../shared/plan/stick/types';
import { Digits } from '../ui/figure';
import { Text } from '../ui/text';
import { colour, font, line } from '../ui/tokens';
import { VerdictShape } from '../ui/verdict';
import { VisuallyHidden } from '../ui/visually-hidden';
import { webStyle } from '../ui/web-style';

export interface PlanStickProps {
  steps: readonly StickStep[];
  /** Accessible name of the list of steps. */
  label: string;
  /** The step's words; default its title. Put a Link in here where steps can be opened. */
  renderTitle?: (step: StickStep) => ReactNode;
  /** What stands below the title: dimensions, waits, an open editor. */
  renderBody?: (step: StickStep) => ReactNode;
  /** At the right end instead of the time: `2 settled`. */
  renderAside?: (step: StickStep) => ReactNode;
  /** Level of the titles as headings; plain text without it. */
  headingLevel?: 2 | 3 | 4;
}

/**
 * The stick down a plan page: each step's text hangs from its own mark, so a stretch is as long as
 * its text. The marks keep order, not scale; the time is printed.
 */
export function PlanStick(props: PlanStickProps) {
  const { steps, label } = props;
  return (
    <View role="list" aria-label={label} style={styles.list}>
      {steps.map((step, i) => (
        <View key={step.id} role="listitem" style={styles.row}>
          <Stretch step={step} previous={steps[i - 1]} last={i === steps.length - 1} />
          <StepText {...props} step={step} />
        </View>
      ))}
    </View>
  );
}

function StepText(props: PlanStickProps & { step: StickStep }) {
  const { step, renderTitle, renderBody, renderAside, headingLevel } = props;
  const current = step.state === 'current';
  const heading = headingLevel ? ({ role: 'heading', 'aria-level': headingLevel } as const) : {};
  return (
    <View style={styles.body}>
      <View style={styles.line}>
        <Text mono size="note" weight={600} tone={current ? 'blue' : 'ink'} style={styles.number}>
          {step.number}
        </Text>
        <Text weight={600} style={styles.title} {...heading}>
          {renderTitle ? renderTitle(step) : step.title}
        </Text>
        {renderAside ? (
          renderAside(step)
        ) : (
          <Text size="small" tone="ink3" style={styles.time}>
            <Digits text={clockTime(step.start)} />
          </Text>
        )}
      </View>
      <View style={styles.below}>{renderBody?.(step)}</View>
      {step.state === 'done' ? <VisuallyHidden>Done</VisuallyHidden> : null}
    </View>
  );
}

interface StretchProps {
  step: StickStep;
  previous: StickStep | undefined;
  last: boolean;
}

/** The stretch beside a step's text, with its mark, shapes, note and break. */
function Stretch({ step, previous, last }: StretchProps) {
  const dye = step.state === 'done';
  const current = step.state === 'current';
  const ink = current ? colour.blue : colour.ink;
  const hanging = spreadShapes(
    step.verdicts.map((v) => v.verdict),
    step.talk.length > 0,
  );
  return (
    <View style={styles.side} aria-hidden>
      <View
        style={[styles.stretch, dye && styles.dyed, current && styles.current, last && styles.end]}
      >
        <View
          style={[
            styles.mark,
            { height: current ? line.thick : line.medium, backgroundColor: ink },
          ]}
        />
        {dye && previous ? <View style={styles.scribe} /> : null}
        {step.failing ? (
          <View style={styles.failing}>
            <VerdictShape kind="fails" size={13} />
          </View>
        ) : null}
        {hanging.shapes.map((s, i) => (
          <View key={i} style={[styles.hang, { top: `${s.share * 100}%` }]}>
            <View style={[styles.hangLine, { backgroundColor: colour.ink }]} />
            <View style={[styles.hangIn, { backgroundColor: dye ? colour.scribe : colour.ink }]} />
            <View style={styles.shape}>
              <VerdictShape kind={s.verdict} size={11} />
            </View>
          </View>
        ))}
        {hanging.note === null ? null : <Note dye={dye} share={hanging.note} />}
        {step.waits.length ? <Break running={step.waits.some((w) => w.running)} /> : null}
      </View>
    </View>
  );
}

/** A note hanging at the left, where talk belongs to the step. */
function Note({ dye, share }: { dye: boolean; share: number }) {
  return (
    <View style={[styles.hang, { top: `${share * 100}%` }]}>
      <Svg
        width={13}
        height={13}
        viewBox="0 0 13 13"
        style={{ position: 'absolute', left: -14, top: -6 }}
      >
        <Path d="M.5 .5h12v8.5h-8l-4 3.5z" fill={colour.film} stroke={colour.ink} />
      </Svg>
      <View style={[styles.hangLine, { backgroundColor: colour.ink }]} />
      <View style={[styles.hangIn, { backgroundColor: dye ? colour.scribe : colour.ink }]} />
    </View>
  );
}

function Break({ running }: { running: boolean }) {
  const gap = 'M0 3h9l3-3 5 6 3-3h10v8h-10l-3 3-5-6-3 3H0z';
  return (
    <Svg
      width={30}
      height={14}
      viewBox="0 0 30 14"
      style={{ position: 'absolute', left: -4.5, bottom: 8 }}
    >
      <Path d={gap} fill={running ? colour.blueWash : colour.film} />
      {running ? (
        <Path d="M2 11l8-8M9 12l8-8M17 11l8-8M24 11l5-5" stroke={colour.blue} strokeWidth={1.2} />
      ) : null}
      <Path d="M0 3h9l3-3 5 6 3-3h10M0 11h9l3-3 5 6 3-3h10" fill="none" stroke={colour.ink} />
    </Svg>
  );
}

const styles = StyleSheet.create({
  list: { paddingTop: 13, alignSelf: 'stretch' },
  row: webStyle({ display: 'flex', flexDirection: 'row', minHeight: 60, alignItems: 'stretch' }),
  side: { width: 42, paddingLeft: 18 },
  stretch: webStyle({
    flex: 1,
    width: 24,
    borderLeftWidth: line.medium,
    borderRightWidth: line.medium,
    borderStyle: 'solid',
    borderColor: colour.ink,
    backgroundColor: colour.sheet,
  }),
  dyed: { backgroundColor: colour.dye },
  current: { backgroundColor: colour.blueWash },
  end: { borderBottomWidth: line.medium },
  mark: { position: 'absolute', left: -1.5, top: 0, width: 37.5 },
  scribe: {
    position: 'absolute',
    left: 0,
    top: 0,
    width: 21,
    height: line.medium,
    backgroundColor: colour.scribe,
  },
  failing: { position: 'absolute', left: -19, top: -5 },
  hang: { position: 'absolute', left: -6, height: line.thin, width: 13 },
  hangLine: { position: 'absolute', left: 0, top: 0, width: 5, height: line.thin },
  hangIn: { position: 'absolute', left: 5, top: 0, width: 8, height: line.thin },
  shape: { position: 'absolute', left: -11, top: -5 },
  body: webStyle({ flex: 1, minWidth: 0, paddingBottom: 14, paddingLeft: 24, marginTop: -12 }),
  line: { flexDirection: 'row', alignItems: 'flex-start', gap: 8 },
  number: webStyle({ minWidth: 18, lineHeight: '24px' }),
  title: webStyle({ flex: 1, minWidth: 0, lineHeight: '24px' }),
  time: webStyle({ fontFamily: font.figures, lineHeight: '24px' }),
  below: { paddingLeft: 26, gap: 4 },
});
