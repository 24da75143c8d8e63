import {
  useId,
  useRef,
  useState,
  type CSSProperties,
  type KeyboardEvent,
  type ReactNode,
} from 'react';
import { StyleSheet, View } from 'react-native';
import { type Dimension } from '../../../shared/plan/document';
import { controlStyles } from '../../ui/field';
import { Row } from '../../ui/layout';
import { Text } from '../../ui/text';
import { colour, font, line, typeScale } from '../../ui/tokens';
import { webStyle } from '../../ui/web-style';
import { completionsAt, faultSpan, type Completion } from './completion';

export interface ExpressionFault {
  at: number;
  message: string;
  cure?: string | undefined;
}

export interface ExpressionFieldProps {
  /** Accessible name; the visible label stands in the column's head or above. */
  label: string;
  value: string;
  onChange: (value: string) => void;
  fault: ExpressionFault | null;
  /** What may be named in it. */
  names: readonly Pick<Dimension, 'symbol' | 'name'>[];
  /** Up or down past the field's list: to the next row. */
  onMove?: (by: 1 | -1) => void;
  autoFocus?: boolean;
  /** What mends the fault in one press. */
  mends?: ReactNode;
}

/** A symbol completed as one types; what is wrong stands under the character it is about. */
export function ExpressionField(props: ExpressionFieldProps) {
  const { label, value, onChange, fault, names } = props;
  const id = useId();
  const input = useRef<HTMLInputElement>(null);
  const [caret, setCaret] = useState<number | null>(null);
  const [chosen, setChosen] = useState(0);
  const [scrolled, setScrolled] = useState(0);
  const found = caret === null ? null : completionsAt(value, Math.min(caret, value.length), names);
  const options = found?.options ?? [];
  const at = Math.min(chosen, options.length - 1);
  const close = () => setCaret(null);
  const take = (option: Completion) => {
    if (!found) return;
    const next = value.slice(0, found.from) + option.insert + value.slice(found.to);
    onChange(next);
    close();
    input.current?.focus();
  };
  const onKeyDown = (event: KeyboardEvent) => {
    const { key } = event;
    const option = options[at];
    const down = key === 'ArrowDown';
    if (option && (key === 'Enter' || key === 'Tab')) take(option);
    else if (option && key === 'Escape') close();
    else if (option && (down || key === 'ArrowUp'))
      setChosen((at + (down ? 1 : options.length - 1)) % options.length);
    else if (props.onMove && (down || key === 'ArrowUp' || key === 'Enter'))
      props.onMove(key === 'ArrowUp' ? -1 : 1);
    else return;
    event.preventDefault();
  };
  return (
    <View style={styles.whole}>
      <View style={[controlStyles.frame, styles.frame, fault && controlStyles.marked]}>
        {fault ? <Mark value={value} at={fault.at} scrolled={scrolled} /> : null}
        <input
          ref={input}
          role="combobox"
          aria-label={label}
          aria-expanded={options.length > 0}
          aria-controls={options.length > 0 ? `${id}-list` : undefined}
          aria-autocomplete="list"
          aria-activedescendant={options.length > 0 ? `${id}-${at}` : undefined}
          aria-invalid={fault ? true : undefined}
          aria-describedby={fault ? `${id}-fault` : undefined}
          value={value}
          onChange={(event) => {
            onChange(event.currentTarget.value);
            setCaret(event.currentTarget.selectionStart);
            setChosen(0);
          }}
          onBlur={close}
          onKeyDown={onKeyDown}
          onScroll={(event) => setScrolled(event.currentTarget.scrollLeft)}
          autoFocus={props.autoFocus}
          autoCapitalize="none"
          autoCorrect="off"
          autoComplete="off"
          spellCheck={false}
          style={inputLook}
        />
      </View>
      {options.length > 0 ? (
        <OptionList id={id} options={options} chosen={at} onTake={take} />
      ) : null}
      {fault ? <Fault id={`${id}-fault`} fault={fault} mends={props.mends} /> : null}
    </View>
  );
}

/** The word that is wrong, washed and underlined behind the text, an arrow under it. */
function Mark({ value, at, scrolled }: { value: string; at: number; scrolled: number }) {
  const [from, to] = faultSpan(value, at);
  return (
    <View style={styles.marks} aria-hidden>
      <View
        style={[
          styles.mark,
          webStyle({
            left: `calc(12px + ${from}ch - ${scrolled}px)`,
            width: `${Math.max(1, to - from)}ch`,
          }),
        ]}
      />
    </View>
  );
}

interface OptionListProps {
  id: string;
  options: readonly Completion[];
  chosen: number;
  onTake: (option: Completion) => void;
}

function OptionList({ id, options, chosen, onTake }: OptionListProps) {
  return (
    <div role="listbox" id={`${id}-list`} aria-label="Names that fit" style={listLook}>
      {options.map((option, i) => (
        <View
          key={option.insert}
          id={`${id}-${i}`}
          role="option"
          aria-selected={i === chosen}
          style={[styles.option, i === chosen && styles.chosen]}
          // Before the field loses the focus and the list is gone.
          onPointerDown={(event) => {
            event.preventDefault();
            onTake(option);
          }}
        >
          <Text mono weight={600}>
            {option.label}
          </Text>
          <Text size="note" tone="ink2" style={styles.note}>
            {option.note}
          </Text>
        </View>
      ))}
    </div>
  );
}

function Fault({ id, fault, mends }: { id: string; fault: ExpressionFault; mends: ReactNode }) {
  return (
    <View style={styles.fault}>
      <Text size="note" tone="failsText" nativeID={id} role="status">
        Column {fault.at + 1}: {fault.message} {fault.cure ?? ''}
      </Text>
      {mends ? (
        <Row gap={8} wrap>
          {mends}
        </Row>
      ) : null}
    </View>
  );
}

const inputLook: CSSProperties = {
  appearance: 'none',
  flex: 1,
  alignSelf: 'stretch',
  minWidth: 0,
  border: 0,
  margin: 0,
  padding: '8px 12px',
  position: 'relative',
  background: 'transparent',
  color: colour.ink,
  fontFamily: font.figures,
  fontSize: typeScale.body.size,
  lineHeight: `${typeScale.body.line}px`,
};

const listLook: CSSProperties = {
  position: 'absolute',
  top: 50,
  left: 0,
  minWidth: 240,
  maxWidth: '100%',
  background: colour.sheet,
  border: `${line.thin}px solid ${colour.ink}`,
  zIndex: 5,
};

const styles = StyleSheet.create({
  whole: { alignSelf: 'stretch', gap: 6, zIndex: 1 },
  frame: { position: 'relative', overflow: 'hidden' },
  marks: webStyle({
    position: 'absolute',
    top: 0,
    bottom: 0,
    left: 0,
    right: 0,
    pointerEvents: 'none',
    fontFamily: font.figures,
    fontSize: typeScale.body.size,
  }),
  mark: webStyle({
    position: 'absolute',
    top: 8,
    bottom: 8,
    backgroundColor: colour.failsWash,
    borderBottomWidth: 2,
    borderBottomStyle: 'solid',
    borderBottomColor: colour.fails,
  }),
  option: webStyle({
    flexDirection: 'row',
    alignItems: 'baseline',
    gap: 12,
    paddingLeft: 12,
    paddingRight: 12,
    minHeight: 44,
    paddingTop: 10,
    cursor: 'pointer',
  }),
  chosen: webStyle({ backgroundColor: colour.blueWash, boxShadow: `inset 3px 0 0 ${colour.blue}` }),
  note: { flexShrink: 1 },
  fault: { gap: 8 },
});
