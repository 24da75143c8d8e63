import { type Token, type Tokens } from 'marked';
import { Fragment, useMemo, type ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { Heading, type HeadingLevel } from './heading';
import { Link } from './link';
import { isReference, proseTokens, safeHref } from './prose-tokens';
import { Text, type TextStyleProps } from './text';
import { colour, line, proseWidth } from './tokens';
import { webStyle } from './web-style';

/** Draws a dimension or a part named in the text. */
export type RenderReference = (ref: { kind: 'dim' | 'part'; id: string }) => ReactNode;

export interface ProseProps extends Pick<TextStyleProps, 'size' | 'tone'> {
  /** Markdown. Raw HTML is printed, not used; links go to https, http and mailto only. */
  children: string;
  renderReference?: RenderReference;
  /** Level the text's first heading gets; default 3. */
  headingsFrom?: HeadingLevel;
}

interface Context {
  text: Pick<TextStyleProps, 'size' | 'tone'>;
  reference: RenderReference;
  headingsFrom: HeadingLevel;
}

/** People's own text, set in our type. */
export function Prose({ children, renderReference, headingsFrom = 3, size, tone }: ProseProps) {
  const tokens = useMemo(() => proseTokens(children), [children]);
  const context: Context = {
    text: { size, tone },
    reference: renderReference ?? (({ id }) => <Text mono>{id}</Text>),
    headingsFrom,
  };
  return <View style={styles.prose}>{blocks(tokens, context)}</View>;
}

function blocks(tokens: readonly Token[], c: Context): ReactNode {
  return tokens.map((token, i) => <Fragment key={i}>{block(token, c)}</Fragment>);
}

/** One block; what is not known is printed as it was written. */
function block(token: Token, c: Context): ReactNode {
  switch (token.type) {
    case 'space':
    case 'def':
      return null;
    case 'heading':
      return (
        <Heading
          level={Math.min(6, token.depth - 1 + c.headingsFrom) as HeadingLevel}
          ruled={false}
        >
          {inlines(token.tokens ?? [], c)}
        </Heading>
      );
    case 'list':
      return <List list={token as Tokens.List} context={c} />;
    case 'blockquote':
      return <View style={styles.quote}>{blocks(token.tokens ?? [], c)}</View>;
    case 'code':
      return (
        <View style={styles.code}>
          <Text size="note" mono>
            {(token as Tokens.Code).text}
          </Text>
        </View>
      );
    case 'hr':
      return <View style={styles.rule} aria-hidden />;
    case 'table':
      return <ProseTable table={token as Tokens.Table} context={c} />;
    case 'paragraph':
    case 'text':
      return (
        <Text {...c.text}>
          {token.tokens ? inlines(token.tokens, c) : plain((token as Tokens.Text).text)}
        </Text>
      );
    default:
      return <Text {...c.text}>{token.raw.trim()}</Text>;
  }
}

function inlines(tokens: readonly Token[], c: Context): ReactNode {
  return tokens.map((token, i) => <Fragment key={i}>{inline(token, c)}</Fragment>);
}

function inline(token: Token, c: Context): ReactNode {
  if (isReference(token)) return c.reference({ kind: token.kind, id: token.id });
  const inner = () => inlines((token as { tokens?: Token[] }).tokens ?? [], c);
  switch (token.type) {
    case 'strong':
      return <Text weight={700}>{inner()}</Text>;
    case 'em':
      return <Text italic>{inner()}</Text>;
    case 'del':
      return <Text style={styles.del}>{inner()}</Text>;
    case 'codespan':
      return <Text mono>{(token as Tokens.Codespan).text}</Text>;
    case 'br':
      return '\n';
    case 'link': {
      const href = safeHref((token as Tokens.Link).href);
      return href ? <Link href={href}>{inner()}</Link> : inner();
    }
    case 'image':
      return plain((token as Tokens.Image).text);
    case 'text':
      return token.tokens ? inner() : plain((token as Tokens.Text).text);
    case 'escape':
      return (token as Tokens.Escape).text;
    default:
      return token.raw;
  }
}

/** The lexer leaves entities as written. */
const entities: Record<string, string> = {
  amp: '&',
  lt: '<',
  gt: '>',
  quot: '"',
  nbsp: '\u00a0',
  '#39': "'",
};
const plain = (text: string) =>
  text.replace(/&(amp|lt|gt|quot|nbsp|#39);/g, (_, name: string) => entities[name] ?? _);

function List({ list, context }: { list: Tokens.List; context: Context }) {
  const start = typeof list.start === 'number' ? list.start : 1;
  return (
    <View role="list" style={styles.list}>
      {list.items.map((item, i) => (
        <View key={i} role="listitem" style={styles.item}>
          <Text {...context.text} mono={list.ordered} tone="ink2" style={styles.marker}>
            {item.task ? (item.checked ? '[x]' : '[ ]') : list.ordered ? `${start + i}` : '–'}
          </Text>
          <View style={styles.itemBody}>{blocks(item.tokens, context)}</View>
        </View>
      ))}
    </View>
  );
}

function ProseTable({ table, context }: { table: Tokens.Table; context: Context }) {
  const cell = (content: Tokens.TableCell, head: boolean, key: number) => (
    <View key={key} role={head ? 'columnheader' : 'cell'} style={styles.tableCell}>
      <Text
        size={head ? 'small' : 'note'}
        tone={head ? 'ink2' : 'ink'}
        align={content.align ?? undefined}
      >
        {inlines(content.tokens, context)}
      </Text>
    </View>
  );
  return (
    <View role="table" style={styles.table}>
      <View role="row" style={[styles.tableRow, styles.tableHead]}>
        {table.header.map((h, i) => cell(h, true, i))}
      </View>
      {table.rows.map((row, r) => (
        <View key={r} role="row" style={styles.tableRow}>
          {row.map((c, i) => cell(c, false, i))}
        </View>
      ))}
    </View>
  );
}

const styles = StyleSheet.create({
  prose: { gap: 12, maxWidth: proseWidth },
  quote: { borderLeftWidth: line.thick, borderLeftColor: colour.rule, paddingLeft: 12, gap: 8 },
  code: webStyle({ padding: 12, backgroundColor: colour.well, overflowX: 'auto' }),
  rule: { height: line.thin, backgroundColor: colour.ruleThin },
  del: { textDecorationLine: 'line-through' },
  list: { gap: 6 },
  item: { flexDirection: 'row', gap: 8 },
  marker: { minWidth: 20 },
  itemBody: { flexShrink: 1, flexGrow: 1, gap: 6 },
  table: webStyle({ overflowX: 'auto' }),
  tableRow: {
    flexDirection: 'row',
    borderBottomWidth: line.thin,
    borderBottomColor: colour.ruleThin,
  },
  tableHead: { borderBottomWidth: line.medium, borderBottomColor: colour.ink },
  tableCell: { flexGrow: 1, flexShrink: 1, flexBasis: 0, paddingVertical: 6, paddingRight: 10 },
});
