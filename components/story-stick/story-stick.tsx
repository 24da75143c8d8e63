import { useEffect, useId, useMemo, useRef, type KeyboardEvent } from 'react';
import { StyleSheet, View } from 'react-native';
import { layoutStick } from '../../shared/plan/stick/layout';
import { bodyLength, panOffset } from '../../shared/plan/stick/pan';
import { currentStep } from '../../shared/plan/stick/scale';
import { stickValueText } from '../../shared/plan/stick/spoken';
import { type StickInput, type StickStep } from '../../shared/plan/stick/types';
import { touch } from '../ui/tokens';
import { webStyle } from '../ui/web-style';
import { BlankStick } from './blank-stick';
import { draftingStickKey, useDraftingKeys, type StickDrafting } from './drafting-keys';
import { frame, StickDrawing } from './stick-drawing';
import { stickKey } from './stick-keys';
import { useLength } from './use-length';
import { useStickPointer } from './use-stick-pointer';

export interface StoryStickProps {
  input: StickInput;
  /** Accessible name, e.g. `Story stick of Shooting board`. */
  label: string;
  /** Place in the clip, seconds; null or left out draws no pointer. */
  now?: number | null;
  /** The step the slider stands on, if not the current one of the input. */
  selected?: string;
  /** Goes to a step: arrows, press. Without any of the callbacks the stick is a picture. */
  onStep?: (id: string) => void;
  /** Enter on a step. */
  onOpen?: (id: string) => void;
  /** Goes to a time in the clip: press and drag. */
  onSeek?: (seconds: number) => void;
  /** Makes the marks movable. */
  drafting?: StickDrafting;
  /** px, if known; otherwise it is measured. */
  width?: number;
}

/** The stick along a clip, a list row or a wide page. It never scrolls the page sideways. */
export function StoryStick(props: StoryStickProps) {
  const { input, width } = props;
  const { length, onLayout } = useLength('width', width);
  useDraftingKeys(props.drafting);
  return (
    <View onLayout={onLayout} style={[styles.measure, width !== undefined && { width }]}>
      {length > 0 && input.steps.length > 0 ? (
        <MeasuredStick {...props} frameLength={length - frame.left - frame.right} />
      ) : (
        <BlankStick />
      )}
    </View>
  );
}

type MeasuredProps = StoryStickProps & { frameLength: number };

function MeasuredStick(props: MeasuredProps) {
  const { input, label, now = null, onStep, onOpen, onSeek, drafting, frameLength } = props;
  const id = useId();
  const length = bodyLength(frameLength, input.steps.length);
  const pointer = useStickPointer({ input, length, drafting, onSeek, onStep });
  const layout = useMemo(() => layoutStick(pointer.shown, length), [pointer.shown, length]);
  const at = standsOn(props);
  const pans = length > frameLength;
  const middle = at ? layout.scale.at((at.start + at.end) / 2) : 0;
  const scroller = usePan(pans, { body: length, frame: frameLength, current: middle });
  const active = Boolean(onStep ?? onOpen ?? onSeek ?? drafting);
  const drawing = (
    <StickDrawing id={id} layout={layout} now={now === null ? null : layout.scale.at(now)} />
  );
  const size = { width: length + frame.left + frame.right };
  return (
    <View ref={scroller} style={[styles.frame, pans && styles.pans]}>
      {active ? (
        <View
          {...sliderProps(props, at)}
          {...(pointer.handlers as object)}
          aria-label={label}
          style={[
            size,
            styles.target,
            pointer.dragging ? styles.dragging : styles.ready,
            pans && styles.panTouch,
          ]}
        >
          {drawing}
        </View>
      ) : (
        <View role="img" aria-label={pictureLabel(label, input)} style={[size, styles.target]}>
          {drawing}
        </View>
      )}
    </View>
  );
}

/** The step the slider stands on. */
const standsOn = ({ input, selected }: StoryStickProps) =>
  input.steps.find((s) => s.id === selected) ?? currentStep(input);

/** One tab stop that says where it is and goes step by step. */
function sliderProps(props: StoryStickProps, at: StickStep | undefined) {
  const { input, onStep, onOpen, drafting } = props;
  const { steps, duration } = input;
  return {
    role: 'slider',
    tabIndex: 0,
    'aria-valuemin': 1,
    'aria-valuemax': steps.length,
    'aria-valuenow': at?.number ?? 1,
    'aria-valuetext': at ? stickValueText(at, steps.length) : undefined,
    onKeyDown: (event: KeyboardEvent<HTMLElement>) => {
      if (drafting && draftingStickKey(event, { drafting, steps, duration, at: at?.id })) return;
      stickKey(event, { steps, at: at?.id, onStep, onOpen });
    },
  } as const;
}

const pictureLabel = (label: string, input: StickInput) => {
  const at = currentStep(input);
  return at ? `${label}. ${stickValueText(at, input.steps.length)}` : label;
};

/** Keeps the current stretch of a panning stick in the middle third of its frame. */
function usePan(
  pans: boolean,
  { body, frame: frameLength, current }: { body: number; frame: number; current: number },
) {
  const scroller = useRef<View>(null);
  useEffect(() => {
    const element = scroller.current as unknown as HTMLElement | null;
    if (!pans || !element) return;
    element.scrollLeft = panOffset({
      body,
      frame: frameLength,
      current,
      offset: element.scrollLeft,
    });
  }, [pans, body, frameLength, current]);
  return scroller;
}

const styles = StyleSheet.create({
  measure: { alignSelf: 'stretch', minWidth: 0 },
  frame: webStyle({ maxWidth: '100%' }),
  pans: webStyle({ overflowX: 'auto', overflowY: 'hidden', scrollbarWidth: 'thin' }),
  target: webStyle({ minHeight: touch.min, userSelect: 'none' }),
  ready: webStyle({ cursor: 'pointer', touchAction: 'pan-y' }),
  dragging: webStyle({ cursor: 'ew-resize', touchAction: 'none' }),
  panTouch: webStyle({ touchAction: 'pan-x pan-y' }),
});
