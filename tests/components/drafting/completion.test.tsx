import { completionsAt, faultSpan } from '../../../components/drafting/dimensions/completion';

const names = [
  { symbol: 'sheet_t', name: 'Sheet thickness' },
  { symbol: 'width', name: 'Outside width' },
  { symbol: 'inner_w', name: 'Width inside' },
  { symbol: 'wheel', name: 'Castor' },
];
const offered = (text: string, caret = text.length) =>
  completionsAt(text, caret, names).options.map((o) => o.insert);

describe('what an expression is completed with', () => {
  it.each([
    ['a symbol by its beginning', 'wid', ['width', 'inner_w']],
    ['a symbol by a part of it', '2*t', ['sheet_t', 'width', 'tan(']],
    ['a symbol by a word of its name', 'width - thick', ['sheet_t']],
    ['a function', 'ma', ['max(', 'made(']],
    ['nothing after a figure: a unit stands there', '18 m', []],
    ['nothing once the name is whole', 'width', []],
    ['nothing without a word', 'width - ', []],
    ['nothing for what nobody is called', 'zzz', []],
  ])('%s', (_, text, wanted) => {
    expect(offered(text)).toEqual(wanted);
  });

  it('leaves a word alone while the caret is inside it', () => {
    expect(offered('width', 2)).toEqual([]);
  });

  it('says which word it would replace', () => {
    expect(completionsAt('2*she + 1', 5, names)).toMatchObject({ from: 2, to: 5 });
  });

  it('offers no more than asked for, in the plan’s order within a rank', () => {
    const many = Array.from({ length: 30 }, (_, i) => ({ symbol: `rail_${i}`, name: '' }));
    expect(completionsAt('rai', 3, many, 5).options.map((o) => o.label)).toEqual(
      many.slice(0, 5).map((d) => d.symbol),
    );
  });
});

describe('the word a fault stands under', () => {
  it.each([
    ['a name', 'a - 2*sheet_thik', 6, [6, 16]],
    ['a figure', '2 + 1.1/2', 4, [4, 9]],
    ['a sign', 'a + * b', 4, [4, 5]],
    ['the end', 'a +', 3, [3, 4]],
    ['beyond the end', 'a', 9, [1, 2]],
  ])('%s', (_, text, at, wanted) => {
    expect(faultSpan(text, at)).toEqual(wanted);
  });
});
