import { builtDemoPlans } from '../../../server/demo';
import { createModel } from '../../../shared/plan/model';
import { renamedIn, renameSymbol } from '../../../shared/plan/rename';
import { checkSheet } from '../../../shared/plan/sheet';

describe('renaming a symbol', () => {
  it.each([
    ['bed_w + runway', 'runway', 'gap', 'bed_w + gap'],
    ['runway_2 - runway', 'runway', 'gap', 'runway_2 - gap'],
    ['made(runway)*2', 'runway', 'gap', 'made(gap)*2'],
    ['w', 'w', 'width', 'width'],
    ['2 mm', 'mm_', 'x', '2 mm'],
  ])('%s', (expression, from, to, expected) => {
    expect(renamedIn(expression, from, to)).toBe(expected);
  });

  it.each(builtDemoPlans().map(({ key, built }) => [key, built.document] as const))(
    'changes no value in %s, whichever symbol is renamed',
    (_, document) => {
      const before = createModel(document);
      for (const dimension of document.dimensions) {
        const renamed = renameSymbol(document, dimension.symbol, 'renamed_once');
        const after = createModel(renamed);
        for (const { id } of document.dimensions) {
          expect(after.dimensions.get(id)?.value?.x).toBe(before.dimensions.get(id)?.value?.x);
        }
        expect(checkSheet(renamed).rows).toEqual(checkSheet(document).rows);
      }
    },
  );
});
