import { type ReactNode } from 'react';
import { StyleSheet, View } from 'react-native';
import { type Dimension } from '../../../shared/plan/document';
import { Button } from '../../ui/button';
import { Row, Stack } from '../../ui/layout';
import { Text } from '../../ui/text';
import { TextField } from '../../ui/text-field';
import { colour, line } from '../../ui/tokens';
import { webStyle } from '../../ui/web-style';
import { type DraftEditor } from '../use-draft-editor';
import { withNewDimension } from '../with-dimension';
import { DimensionValue } from './dimension-row';
import { ExpressionField } from './expression-field';
import { draftPreference, spreadFigure } from './facts';
import { Mends } from './mends';
import { Figure } from '../../ui/figure';

export interface OpenRowProps {
  dimension: Dimension;
  editor: DraftEditor;
  onChange: (dimension: Dimension) => void;
  /** To the row above or below. */
  onMove: (by: 1 | -1) => void;
  onClose: () => void;
  autoFocus: boolean;
  /** What else stands under it where there is no pane beside the table. */
  below?: ReactNode;
}

/** The dimension being worked on: its figure or expression, its tolerance, and what they make. */
export function OpenRow({ dimension: d, editor, onChange, onMove, ...rest }: OpenRowProps) {
  const { document, model, good } = editor;
  const state = model.dimensions.get(d.id);
  const before = good.get(d.id);
  const preference = draftPreference(document.units);
  const fault = state?.error?.in === 'expression' ? state.error : null;
  const said =
    fault && before ? { ...fault, cure: lastGoodWords(fault.cure, before, document) } : fault;
  const put = (expression: string) => onChange({ ...d, expression });
  return (
    <View role="row" aria-current="true" style={styles.open}>
      <View role="cell" style={styles.cell}>
        <Row justify="space-between" align="flex-start" gap={12}>
          <Stack gap={4} style={{ flexShrink: 1 }}>
            <Text mono weight={700}>
              {d.symbol}
            </Text>
            <Text size="small" tone="ink2">
              {d.name}
            </Text>
          </Stack>
          <Row gap={12} align="baseline">
            <Text size="lead">
              <DimensionValue state={state} good={before} preference={preference} />
            </Text>
            {d.origin === 'derived' && state?.value && state.value.worst > 1e-9 ? (
              <Text size="note" tone="ink2">
                worst <Figure figure={spreadFigure(state.value.worst, state, preference)} />
              </Text>
            ) : null}
          </Row>
        </Row>
        <Row gap={12} align="flex-start" wrap>
          <View style={styles.grow}>
            <ExpressionField
              key={d.id}
              label={`${d.origin === 'derived' ? 'Expression' : 'Figure'} of ${d.symbol}`}
              value={d.expression}
              onChange={put}
              fault={said}
              names={document.dimensions.filter((other) => other.id !== d.id)}
              onMove={onMove}
              autoFocus={rest.autoFocus}
              mends={
                fault ? (
                  <Mends
                    text={d.expression}
                    fault={fault}
                    document={document}
                    onText={put}
                    onAdd={(symbol) => editor.change((doc) => withNewDimension(doc, symbol))}
                  />
                ) : null
              }
            />
          </View>
          <View style={styles.tolerance}>
            <PlusMinus dimension={d} onChange={onChange} fault={toleranceFault(state?.error)} />
          </View>
          <Button size="small" label={`Close ${d.symbol}`} onPress={rest.onClose}>
            Close
          </Button>
        </Row>
        {rest.below}
      </View>
    </View>
  );
}

const toleranceFault = (error: { in: string; message: string; cure: string } | null | undefined) =>
  error?.in === 'tolerance' ? `${error.message} ${error.cure}` : undefined;

/** The cure, and the figure that was good before. */
function lastGoodWords(
  cure: string,
  before: NonNullable<ReturnType<DraftEditor['good']['get']>>,
  document: DraftEditor['document'],
): string {
  const value = before.value;
  if (!value || before.kind !== 'length') return cure;
  const said = spreadFigure(value.x, before, draftPreference(document.units));
  return `${cure} The last good figure was ${said.decimal ?? said.whole ?? ''} ${said.unit ?? ''}.`;
}

/** ± in the row; the other forms of a tolerance stand with the details. */
function PlusMinus({
  dimension: d,
  onChange,
  fault,
}: Pick<OpenRowProps, 'dimension' | 'onChange'> & { fault: string | undefined }) {
  const { tolerance } = d;
  if (tolerance.form !== 'none' && tolerance.form !== 'plus-minus')
    return (
      <Text size="note" tone="ink2">
        {tolerance.form === 'iso2768' ? `ISO 2768-${tolerance.class}` : 'tolerance below'}
      </Text>
    );
  return (
    <TextField
      label={`Tolerance of ${d.symbol}, plus or minus`}
      hideLabel
      mono
      before={<Text tone="ink2">±</Text>}
      value={tolerance.form === 'plus-minus' ? tolerance.by : ''}
      onChange={(by) =>
        onChange({
          ...d,
          tolerance: by.trim() === '' ? { form: 'none' } : { form: 'plus-minus', by },
        })
      }
      error={fault}
    />
  );
}

const styles = StyleSheet.create({
  cell: { gap: 10 },
  open: webStyle({
    paddingTop: 10,
    paddingBottom: 12,
    paddingLeft: 10,
    paddingRight: 6,
    backgroundColor: colour.blueWash,
    boxShadow: `inset 2.5px 0 0 ${colour.blue}`,
    borderBottomWidth: line.thin,
    borderBottomStyle: 'solid',
    borderBottomColor: colour.ruleThin,
    zIndex: 2,
  }),
  grow: { flexGrow: 1, flexShrink: 1, flexBasis: 220, minWidth: 0 },
  tolerance: { width: 130 },
});
