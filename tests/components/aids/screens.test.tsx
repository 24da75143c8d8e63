import { render } from '@testing-library/react';
import { preferencesSchema } from '../../../shared/api/accounts';
import { aids } from '../../../shared/aids';
import { readForm, type Values } from '../../../components/aids/form-values';
import { screens } from '../../../components/aids/screens';
import { showFor } from '../../../components/aids/show';

const cases = screens.flatMap((screen) =>
  (['mm', 'in'] as const).map((units) => ({ id: screen.aid.id, screen, units })),
);
const shown = (units: 'mm' | 'in', decimals = false) =>
  showFor(preferencesSchema.parse({ units }), decimals);

it('has one screen for an aid, of an aid that is listed', () => {
  const ids = screens.map(({ aid }) => aid.id);
  expect(new Set(ids).size).toBe(ids.length);
  expect(aids.map(({ id }) => id)).toEqual(expect.arrayContaining(ids));
});

describe.each(cases)('$id in $units', ({ screen, units }) => {
  const start = screen.start[units];
  const work = (values: Values, decimals = false) => {
    const read = readForm(screen.parts(values, units), values, units);
    return { ...read, worked: screen.work(read.input, shown(units, decimals)) };
  };

  it('answers for what stands in its form first, and draws it', () => {
    const { errors, worked } = work(start);
    expect(errors).toEqual({});
    if (!worked.ok) throw new Error(worked.reason);
    const words = JSON.stringify(worked.says);
    expect(words).not.toMatch(/NaN|undefined|Infinity/);
    const { container } = render(<>{worked.drawing}</>);
    expect(container.innerHTML).toContain('<svg');
    expect(container.innerHTML).not.toMatch(/NaN|undefined|Infinity/);
    expect(work(start, true).worked.ok).toBe(true);
  });

  it('moves its drawing with the figures', () => {
    const figures = screen
      .parts(start, units)
      .flatMap((part) =>
        part.kind === 'rows'
          ? part.columns.map((c) => ({ ...c, key: `${part.key}.0.${c.key}` }))
          : [part],
      )
      .filter(({ kind }) => kind === 'length' || kind === 'number' || kind === 'temperature');
    const choices = screen.parts(start, units).filter((part) => part.kind === 'choice');
    const drawings = new Set(
      [
        start,
        ...figures.map(({ key }) => ({
          ...start,
          [key]: (start[key] ?? '').replace(/\d/, (d) => String((Number(d) % 8) + 1)),
        })),
        ...choices.flatMap((part) =>
          'options' in part
            ? (part.options ?? []).map(({ value }) => ({ ...start, [part.key]: value }))
            : [],
        ),
      ].map((values) => {
        const { worked } = work(values);
        return worked.ok ? render(<>{worked.drawing}</>).container.innerHTML : '';
      }),
    );
    expect(drawings.size).toBeGreaterThan(1);
  });

  it('asks for what is missing and never answers from an empty form', () => {
    const { errors, worked } = work({});
    expect(Object.keys(errors).length > 0 || !worked.ok).toBe(true);
  });
});

describe('what is typed', () => {
  const part = { key: 'a', label: 'A' };
  const read = (
    kind: 'length' | 'lengths' | 'temperature' | 'number',
    text: string,
    units: 'mm' | 'in' = 'mm',
  ) => readForm([{ ...part, kind }], { a: text }, units);

  it('takes a bare length in the person’s unit, and any unit that is said', () => {
    expect(read('length', '3/4', 'in').input).toEqual({ a: 19.05 });
    expect(read('length', '3/4 in').input).toEqual({ a: 19.05 });
    expect(read('length', '-2').input).toEqual({ a: -2 });
    expect(read('lengths', '1/16 in, 3; 2.5').input).toEqual({ a: [1.5875, 3, 2.5] });
  });

  it('takes °F with inches, a comma as the point', () => {
    expect(read('temperature', '68', 'in').input).toEqual({ a: 20 });
    expect(read('number', '12,5').input).toEqual({ a: 12.5 });
  });

  it.each(['x', '1e999', '--2', '1/2/3'])('says what is wrong with %s', (text) => {
    expect(Object.keys(read('length', text).errors)).toEqual(['a']);
    expect(Object.keys(read('number', text).errors)).toEqual(['a']);
  });

  it('reads rows of a list and what lies one deeper', () => {
    const parts = [
      {
        key: 'day',
        kind: 'rows' as const,
        noun: 'Machine',
        columns: [{ ...part, key: 'level', kind: 'number' as const }],
      },
      { ...part, key: 'label.open', kind: 'number' as const, optional: true },
    ];
    const values = {
      'day.count': '2',
      'day.0.level': '90',
      'day.1.level': '95',
      'label.open': '7',
    };
    expect(readForm(parts, values, 'mm').input).toEqual({
      day: [{ level: 90 }, { level: 95 }],
      label: { open: 7 },
    });
  });
});
