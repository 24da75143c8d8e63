import {
  cutList,
  layBars,
  partsWithoutStock,
  stavesOf,
  stockJobs,
} from '../../../shared/layout/plan';
import { buyingList } from '../../../shared/layout/buying';
import { board, ids, modelOf, newId, ply, strip } from './plan';

const part = { mark: 'A', name: 'Rail', length: '400 mm', width: '40 mm', stockId: ids.strip };

describe('the cut list', () => {
  it('has sizes as worked out, rough sizes beside them, and the steps that make each', () => {
    const partId = newId();
    const model = modelOf({
      stock: [strip],
      dimensions: [{ name: 'Span', symbol: 'span', origin: 'given', expression: '390 mm' }],
      parts: [
        {
          ...part,
          id: partId,
          length: 'span + 10 mm',
          allowance: '5 mm',
          quantity: 2,
        } as typeof part,
      ],
      steps: [
        { title: 'Rough it', parts: [{ partId, to: 'roughed' }] },
        { title: 'Cut it', parts: [{ partId, to: 'sized' }] },
      ],
    });
    expect(cutList(model)).toMatchObject([
      {
        mark: 'A',
        quantity: 2,
        length: 400,
        width: 40,
        thickness: 10,
        rough: { length: 405, width: 45 },
        stock: 'Maple strip',
        steps: [
          { number: 1, to: 'roughed' },
          { number: 2, to: 'sized' },
        ],
        fault: null,
      },
    ]);
  });

  it('says which dimension does not come out, and the rest goes on', () => {
    const model = modelOf({
      stock: [strip],
      parts: [
        { ...part, length: 'spam' },
        { ...part, mark: 'B', name: 'Post' },
      ],
    });
    const [job] = stockJobs(model);
    expect(job?.faults.join()).toContain('A, Rail: its length does not come out.');
    expect(job?.faults.join()).toContain('spam');
    expect(job?.pieces.map((p) => p.mark)).toEqual(['B']);
  });

  it('names parts of no stock', () => {
    const model = modelOf({ stock: [strip], parts: [{ ...part, stockId: undefined }] });
    expect(partsWithoutStock(model).map((row) => row.mark)).toEqual(['A']);
    expect(stockJobs(model)).toEqual([]);
  });
});

describe('what to cut from each stock', () => {
  it('takes spares, test pieces and helpers along', () => {
    const roles = ['part', 'spare', 'test-piece', 'helper'] as const;
    const model = modelOf({ stock: [strip], parts: roles.map((role) => ({ ...part, role })) });
    expect(stockJobs(model)[0]?.pieces.map((p) => p.role)).toEqual([...roles]);
  });
  it('turns a part whose grain runs across, and lets one without grain lie as it likes', () => {
    const grains = ['length', 'width', 'free'] as const;
    const model = modelOf({
      stock: [ply],
      parts: grains.map((grain) => ({ ...part, stockId: ids.ply, grain })),
    });
    const [along, across, free] = stockJobs(model)[0]?.pieces ?? [];
    expect([along?.length, along?.turn]).toEqual([400, false]);
    expect([across?.length, across?.turn]).toEqual([40, false]);
    expect(free?.turn).toBe(true);
  });
  it('takes a piece for every layer of a lamination', () => {
    const model = modelOf({
      dimensions: [{ name: 'Sheet', symbol: 'sheet_t', origin: 'taken', expression: '18 mm' }],
      stock: [{ ...ply, thickness: 'sheet_t' }],
      parts: [
        { ...part, stockId: ids.ply, quantity: 2, layers: ['sheet_t', 'sheet_t', 'sheet_t'] },
      ],
    });
    expect(stockJobs(model)[0]?.pieces[0]?.quantity).toBe(6);
  });
  it('is a matter of lengths where every part takes the whole width', () => {
    const whole = modelOf({
      stock: [board],
      parts: [{ ...part, stockId: ids.board, width: '150 mm' }],
    });
    const ripped = modelOf({ stock: [board], parts: [{ ...part, stockId: ids.board }] });
    expect(stockJobs(whole)[0]?.kind).toBe('bars');
    expect(stockJobs(ripped)[0]?.kind).toBe('sheets');
  });
  it('splits a panel wider than the boards into staves with an allowance', () => {
    const model = modelOf({
      stock: [board],
      parts: [{ ...part, name: 'Top', stockId: ids.board, length: '900 mm', width: '400 mm' }],
    });
    // 400 over boards of 150 less 3 for the joints: three staves of 133 1/3 and 3 more.
    expect(stockJobs(model)[0]?.pieces[0]).toMatchObject({
      name: 'Top, stave',
      quantity: 3,
      staves: 3,
      length: 920,
    });
    expect(stockJobs(model)[0]?.pieces[0]?.width).toBeCloseTo(136.333, 3);
    const narrow = stockJobs(model)[0]?.pieces[0];
    if (narrow) expect(stavesOf(narrow, 2)).toBe(narrow);
  });
  it('uses the kerf, sizes, prices and pieces of the person’s own shop', () => {
    const model = modelOf({ stock: [strip], parts: [part] });
    const own = { id: newId(), name: 'Maple end', form: 'strip' as const, thickness: 10.3 };
    const [job] = stockJobs(model, {
      kerf: 1.2,
      own: [
        { ...own, length: 500, width: 40, quantity: 1, offcut: true },
        { ...own, id: newId(), thickness: 14, length: 500, width: 40, quantity: 1, offcut: true },
      ],
      sizes: { [ids.strip]: [{ id: 'mine', length: 1800, width: 40, price: 12 }] },
      without: [strip.sizes[0]?.id ?? ''],
      prices: { mine: 11 },
    });
    expect(job?.kerf).toBe(1.2);
    expect(job?.stock.map((s) => [s.source, s.length, s.price])).toEqual([
      ['shop', 500, 0],
      ['sale', 1800, 11],
    ]);
  });
});

describe('laid out and bought', () => {
  const model = modelOf({
    stock: [strip],
    parts: [
      { ...part, quantity: 5 },
      { ...part, mark: 'L', name: 'Long', length: '1200 mm' },
    ],
    hardware: [{ kind: 'screw', name: 'Screw 4 × 40', quantity: 30, packOf: 25, price: 3 }],
    consumables: [{ kind: 'finish', name: 'Oil' }],
  });
  it('cuts from the shop first, names what no strip is long enough for, and buys the rest', () => {
    const own = {
      id: newId(),
      name: 'Maple end',
      form: 'strip' as const,
      thickness: 10,
      length: 450,
      width: 40,
      quantity: 1,
      offcut: true,
    };
    const [job] = stockJobs(model, { own: [own] });
    if (!job) throw new Error('No job.');
    const laid = layBars(job);
    expect(laid.leftOut).toEqual([{ piece: 1, quantity: 1, because: 'too-big' }]);
    expect(laid).toMatchObject({ measure: 'price', cost: 1600, proven: true });
    const list = buyingList(model, [{ job, laid }], {
      have: { [model.document.hardware[0]?.id ?? '']: 10 },
    });
    expect(list.lines.map((l) => [l.name, l.needed, l.have, l.buy, l.total])).toEqual([
      ['Maple end', 1, 1, 0, 0],
      ['Maple strip', 2, 0, 2, 16],
      ['Screw 4 × 40', 30, 10, 1, 3],
      ['Oil', 1, 0, 1, null],
    ]);
    expect(list).toMatchObject({ total: 19, withoutPrice: 1 });
  });
});
