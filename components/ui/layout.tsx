import { type ReactNode } from 'react';
import { StyleSheet, View, type StyleProp, type ViewStyle } from 'react-native';
import { colour, line, space } from './tokens';
import { webStyle } from './web-style';

type Gap = 4 | 8 | 12 | 16 | 24 | 32 | 48;

export interface StackProps {
  gap?: Gap;
  children: ReactNode;
  style?: StyleProp<ViewStyle>;
}

/** Things below each other. */
export function Stack({ gap = 16, children, style }: StackProps) {
  return <View style={[{ gap, alignSelf: 'stretch' }, style]}>{children}</View>;
}

export interface RowProps extends StackProps {
  align?: 'center' | 'baseline' | 'flex-start' | 'flex-end' | 'stretch';
  justify?: 'flex-start' | 'space-between' | 'flex-end' | 'center';
  wrap?: boolean;
}

/** Things beside each other. */
export function Row({ gap = 8, align = 'center', justify, wrap, children, style }: RowProps) {
  const own: ViewStyle = {
    flexDirection: 'row',
    gap,
    alignItems: align,
    justifyContent: justify,
    flexWrap: wrap ? 'wrap' : 'nowrap',
  };
  return <View style={[own, style]}>{children}</View>;
}

/** A part of a page with air above it. */
export function Section({ children, gap = 12 }: { children: ReactNode; gap?: Gap }) {
  return <View style={{ gap, marginTop: space.s8 }}>{children}</View>;
}

/** A thin rule between rows, or a medium one between parts. */
export function Rule({ weight = 'thin' }: { weight?: 'thin' | 'medium' }) {
  return <View style={weight === 'thin' ? styles.thin : styles.medium} aria-hidden />;
}

export interface PageProps {
  children: ReactNode;
  /** Widest the content gets: forms 480, a column 760, everything. */
  width?: 'form' | 'column' | 'full';
  gap?: Gap;
}

const widths = { form: 480, column: 760, full: undefined } as const;

/** The content of a screen with the page's margins: 16 on a phone, 24–28 from there on. */
export function Page({ children, width = 'column', gap = 24 }: PageProps) {
  return (
    <View dataSet={{ page: 'yes' }} style={[styles.page, { gap, maxWidth: widths[width] }]}>
      {children}
    </View>
  );
}

export interface PanesProps {
  children: ReactNode;
  /** Third pane: 320–400 beside the content from 1024 on, below it before. */
  aside: ReactNode;
  /** Accessible name of the third pane. */
  asideLabel: string;
  asideWidth?: number;
}

/** Content with a third pane, a medium line between them; the pane scrolls by itself. */
export function Panes({ children, aside, asideLabel, asideWidth = 340 }: PanesProps) {
  return (
    <View dataSet={{ panes: 'yes' }} style={styles.panes}>
      <View dataSet={{ pane: 'content' }} style={styles.pane}>
        {children}
      </View>
      <View
        role="complementary"
        aria-label={asideLabel}
        dataSet={{ pane: 'aside' }}
        style={webStyle({ '--aside': `${asideWidth}px` } as object)}
      >
        {aside}
      </View>
    </View>
  );
}

export interface WorkPanesProps {
  /** Two or three panes of a working screen, each scrolling by itself from 1024 on, below each other before. */
  panes: readonly { key: string; label: string; width?: number; content: ReactNode }[];
  /** Height of what stands above them, in px. */
  below?: number;
}

/** Side by side panes for drafting. A pane without `width` shares what is left. */
export function WorkPanes({ panes, below = 56 }: WorkPanesProps) {
  return (
    <View dataSet={{ panes: 'work' }} style={webStyle({ '--below': `${below}px` } as object)}>
      {panes.map((pane) => (
        <View
          key={pane.key}
          role="region"
          aria-label={pane.label}
          tabIndex={0}
          dataSet={{ pane: 'work', focusInside: 'yes' }}
          style={webStyle({
            '--pane': pane.width ? `0 0 ${pane.width}px` : '1 1 0px',
          } as object)}
        >
          {pane.content}
        </View>
      ))}
    </View>
  );
}

const styles = StyleSheet.create({
  thin: { height: line.thin, backgroundColor: colour.ruleThin, alignSelf: 'stretch' },
  medium: { height: line.medium, backgroundColor: colour.ink, alignSelf: 'stretch' },
  page: { width: '100%' },
  panes: { alignSelf: 'stretch' },
  pane: { minWidth: 0 },
});
