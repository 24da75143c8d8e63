import { useId } from 'react';
import { type PlanDocument } from '../../../shared/plan/document';
import { type Tolerance } from '../../../shared/plan/document-values';
import { Button } from '../../ui/button';
import { Heading } from '../../ui/heading';
import { Row, Stack } from '../../ui/layout';
import { Select } from '../../ui/select';
import { TextField } from '../../ui/text-field';
import { dimensionFields } from '../fields/dimensions';
import { OneField } from '../fields/one-field';
import { type DetailProps } from './detail-props';

/** Name, symbol and all the fields that do not stand in the row. */
export function DimensionFields({ dimension: d, editor, onChange, onRemove }: DetailProps) {
  const fields = dimensionFields(editor.document, d);
  return (
    <Stack gap={12}>
      <Heading level={3}>Fields</Heading>
      {fields.map((field) => (
        <OneField
          key={`${d.id}-${field.key}`}
          field={field}
          item={d}
          onChange={(fn) => onChange(fn(d))}
        />
      ))}
      <ToleranceFields
        key={d.id}
        tolerance={d.tolerance}
        units={editor.document.units}
        fault={faultWords(editor.model.dimensions.get(d.id)?.error)}
        onChange={(tolerance) => onChange({ ...d, tolerance })}
      />
      <Row>
        <Button kind="danger" size="small" label={`Take out ${d.symbol}`} onPress={onRemove}>
          Take out
        </Button>
      </Row>
    </Stack>
  );
}

const faultWords = (error: { in: string; message: string; cure: string } | null | undefined) =>
  error?.in === 'tolerance' ? `${error.message} ${error.cure}` : undefined;

const forms: readonly { value: Tolerance['form']; label: string }[] = [
  { value: 'none', label: 'none' },
  { value: 'plus-minus', label: '± the same both ways' },
  { value: 'unequal', label: 'more one way than the other' },
  { value: 'limits', label: 'from a least to a most' },
  { value: 'iso2768', label: 'by class of ISO 2768-1' },
];
const classes = [
  { value: 'f', label: 'f, fine' },
  { value: 'm', label: 'm, medium' },
  { value: 'c', label: 'c, coarse' },
  { value: 'v', label: 'v, very coarse' },
] as const;

/** A tolerance of another form with what can be kept of the one before. */
export function reformed(before: Tolerance, form: Tolerance['form']): Tolerance {
  const by =
    before.form === 'plus-minus' ? before.by : before.form === 'unequal' ? before.plus : '';
  if (form === 'plus-minus') return { form, by };
  if (form === 'unequal') return { form, plus: by, minus: by };
  if (form === 'limits') return { form, low: '', high: '' };
  if (form === 'iso2768') return { form, class: 'm' };
  return { form: 'none' };
}

interface ToleranceFieldsProps {
  tolerance: Tolerance;
  units: PlanDocument['units'];
  fault: string | undefined;
  onChange: (tolerance: Tolerance) => void;
}

function ToleranceFields({ tolerance: t, fault, onChange }: ToleranceFieldsProps) {
  const id = useId();
  const text = (label: string, value: string, put: (text: string) => Tolerance, last = true) => (
    <TextField
      key={`${id}-${label}`}
      label={label}
      mono
      value={value}
      onChange={(next) => onChange(put(next))}
      error={last ? fault : undefined}
    />
  );
  return (
    <>
      <Select
        label="Tolerance"
        options={forms}
        value={t.form}
        onChange={(form) => onChange(reformed(t, form))}
      />
      {t.form === 'plus-minus' ? text('Plus or minus', t.by, (by) => ({ ...t, by })) : null}
      {t.form === 'unequal' ? (
        <>
          {text('Plus', t.plus, (plus) => ({ ...t, plus }), false)}
          {text('Minus', t.minus, (minus) => ({ ...t, minus }))}
        </>
      ) : null}
      {t.form === 'limits' ? (
        <>
          {text('Least', t.low, (low) => ({ ...t, low }), false)}
          {text('Most', t.high, (high) => ({ ...t, high }))}
        </>
      ) : null}
      {t.form === 'iso2768' ? (
        <Select
          label="Class"
          options={classes}
          value={t.class}
          onChange={(value) => onChange({ form: 'iso2768', class: value })}
        />
      ) : null}
    </>
  );
}
