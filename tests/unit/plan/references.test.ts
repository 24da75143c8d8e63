import fc from 'fast-check';
import { builtDemoPlans } from '../../../server/demo';
import { looseNames, shownText, storedText } from '../../../shared/plan/references';

const document = builtDemoPlans()[0]!.built.document;

describe('references in a step’s text', () => {
  it('shows symbols and marks, and stores ids', () => {
    for (const step of document.steps) {
      const text = shownText(step.text, document);
      expect(text).not.toMatch(/[0-9a-f]{8}-/);
      expect(storedText(text, document)).toBe(step.text);
    }
  });

  it('leaves a name that stands for nothing as it was typed, and names it', () => {
    expect(storedText('Cut {{nothing_here}} and {{part ZZ}}.', document)).toBe(
      'Cut {{nothing_here}} and {{part ZZ}}.',
    );
    expect(looseNames('Cut {{nothing_here}} and {{part ZZ}}.')).toEqual([
      'nothing_here',
      'part ZZ',
    ]);
  });

  it('comes back the same from any mixture', () => {
    const names = [
      ...document.dimensions.map((d) => `{{${d.symbol}}}`),
      ...document.parts.map((p) => `{{part ${p.mark}}}`),
    ];
    fc.assert(
      fc.property(
        fc.array(
          fc.oneof(
            fc.constantFrom(...names),
            fc.string().filter((s) => !/[{}]/.test(s)),
          ),
        ),
        (pieces) => {
          const text = pieces.join('');
          expect(shownText(storedText(text, document), document)).toBe(text);
        },
      ),
    );
  });
});
