import { Fragment } from 'react';
import { StyleSheet, Text as RawText, View } from 'react-native';
import Svg, { Path } from 'react-native-svg';
import { parseFigure, speakFigure, type FigureParts } from './figure-words';
import {
  textStyle,
  useInsideText,
  type TextStyleProps,
  type TextTone,
  type TextWeight,
} from './text';
import { font, type TypeSize } from './tokens';
import { VisuallyHidden } from './visually-hidden';
import { webStyle } from './web-style';

export { parseFigure, speakFigure, type FigureParts } from './figure-words';

export interface FigureProps {
  /** Parts to draw, or a plain text such as `2 3/4 in` that is taken apart here. */
  figure: FigureParts | string;
  /** Leave out inside a Text to take over its size. */
  size?: TypeSize;
  tone?: TextTone;
  weight?: TextWeight;
  /** Slanted in text and tables, stacked in the entry field and on the bench figure. */
  fraction?: 'slanted' | 'stacked';
  /** In a table the unit stands in the column's head. */
  withoutUnit?: boolean;
}

/** A figure as it is drawn everywhere: Mono digits, drawn fraction, unit set off, read aloud as words. */
export function Figure({
  figure,
  size,
  tone,
  weight,
  fraction = 'slanted',
  withoutUnit,
}: FigureProps) {
  const f = typeof figure === 'string' ? parseFigure(figure) : figure;
  const hasFraction = f.numerator !== undefined && f.denominator !== undefined;
  const digits = f.decimal ?? (f.whole === undefined ? '' : String(f.whole));
  const inside = useInsideText();
  const look: TextStyleProps = inside
    ? { size, tone, weight }
    : { size: size ?? 'body', tone: tone ?? 'ink', weight };
  const style = { ...textStyle(look), fontFamily: font.figures };
  const Fraction = fraction === 'stacked' ? Stacked : Slanted;
  return (
    <RawText style={[style, styles.figure]}>
      <VisuallyHidden>{speakFigure(f)}</VisuallyHidden>
      <RawText aria-hidden>
        {f.sign ? <RawText style={styles.sign}>{f.sign === '-' ? '−' : f.sign}</RawText> : null}
        {f.feet ? (
          <>
            <Digits text={String(f.feet)} />
            <Copied text=" " />
            <RawText style={[styles.unit, styles.feet]}>ft</RawText>
            <Copied text=" " />
          </>
        ) : null}
        {digits ? <Digits text={digits} /> : null}
        {hasFraction && digits ? <Copied text=" " /> : null}
        {hasFraction ? (
          <Fraction
            numerator={String(f.numerator)}
            denominator={String(f.denominator)}
            bold={weight === 700}
          />
        ) : null}
        {f.unit && !withoutUnit ? (
          <>
            {f.unit === '°' ? null : <Copied text=" " />}
            <RawText style={f.unit === '°' ? styles.degree : styles.unit}>{f.unit}</RawText>
          </>
        ) : null}
      </RawText>
    </RawText>
  );
}

/** Takes no room, but a copied figure reads `2 3/4 in` and not `234in`. */
function Copied({ text }: { text: string }) {
  return <RawText style={styles.copied}>{text}</RawText>;
}

/** Digits with the points and colons pulled in, which in Mono would take a full cell. */
export function Digits({ text }: { text: string }) {
  return text
    .split(/([.:])/)
    .map((run, i) => (
      <Fragment key={i}>
        {run === '.' || run === ':' ? <RawText style={styles.point}>{run}</RawText> : run}
      </Fragment>
    ));
}

interface FractionProps {
  numerator: string;
  denominator: string;
  bold: boolean;
}

function Slanted({ numerator, denominator, bold }: FractionProps) {
  const weight = { fontWeight: bold ? 700 : 600 } as const;
  return (
    <RawText style={styles.slanted}>
      <RawText style={[styles.term, styles.raised, weight]}>{numerator}</RawText>
      <Copied text="/" />
      <Svg viewBox="0 0 30 78" style={styles.stroke}>
        <Path d="M2 78 28 0" stroke="currentColor" strokeWidth={6.5} fill="none" />
      </Svg>
      <RawText style={[styles.term, weight]}>{denominator}</RawText>
    </RawText>
  );
}

function Stacked({ numerator, denominator }: FractionProps) {
  return (
    <View style={styles.stacked}>
      <RawText style={styles.over}>
        {numerator}
        <Copied text="/" />
      </RawText>
      <RawText style={styles.under}>{denominator}</RawText>
    </View>
  );
}

const styles = StyleSheet.create({
  figure: webStyle({ whiteSpace: 'nowrap', fontStyle: 'normal' }),
  copied: { fontSize: 0, lineHeight: 0, letterSpacing: 0 },
  sign: webStyle({ marginRight: '0.05em' }),
  point: webStyle({ marginLeft: '-0.17em', marginRight: '-0.17em' }),
  unit: webStyle({
    fontFamily: font.text,
    fontWeight: 400,
    fontSize: '0.82em',
    marginLeft: '0.22em',
  }),
  feet: webStyle({ marginRight: '0.35em' }),
  degree: webStyle({ fontFamily: font.text, fontWeight: 400, marginLeft: '0.04em' }),
  slanted: webStyle({ whiteSpace: 'nowrap', marginLeft: '0.06em' }),
  term: webStyle({ fontSize: '0.64em', letterSpacing: '-0.03em' }),
  raised: webStyle({ position: 'relative', top: '-0.376em' }),
  stroke: webStyle({
    display: 'inline-block',
    width: '0.3em',
    height: '0.78em',
    marginLeft: '-0.065em',
    marginRight: '-0.055em',
    verticalAlign: '-0.07em',
    overflow: 'visible',
  }),
  stacked: webStyle({
    verticalAlign: 'middle',
    marginLeft: '0.12em',
    fontSize: '0.54em',
    top: '-0.06em',
  }),
  over: webStyle({
    fontWeight: 600,
    lineHeight: '1em',
    textAlign: 'center',
    borderBottomWidth: 'max(1px, 0.085em)',
    borderBottomStyle: 'solid',
    borderBottomColor: 'currentColor',
    paddingLeft: '0.08em',
    paddingRight: '0.08em',
    paddingBottom: '0.06em',
  }),
  under: webStyle({ fontWeight: 600, lineHeight: '1em', textAlign: 'center', paddingTop: '0.1em' }),
});
