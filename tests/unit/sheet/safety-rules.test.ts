import { type PlanDocument } from '../../../shared/plan/document';
import { rules } from '../../../shared/plan/sheet/rules';
import { board, cut, found, guard, id, off, steps, table } from './planted.data';

describe('rules both ways', () => {
  it.each(table)('%s: %s finds it, and is quiet when it is mended', (_, rule, trips, quiet) => {
    expect(found(rule, trips).length).toBeGreaterThan(0);
    expect(found(rule, quiet)).toEqual([]);
  });

  it('gives every rule an id, a level and a source of its own', () => {
    expect(new Set(rules.map((r) => r.id)).size).toBe(rules.length);
    for (const rule of rules) expect(rule.source.length).toBeGreaterThan(10);
  });
});

describe('guards through alternatives and repeats', () => {
  const group = (stepIds: string[], name: string) => ({ id: id(), name, stepIds });
  const alternatives = (firstPutsBack: boolean): PlanDocument => ({
    ...steps({
      1: {
        actions: [
          off,
          guard('blade-guard', 'off'),
          cut({ kind: 'groove', heldBy: ['hold-down'] }),
          ...(firstPutsBack ? [guard('blade-guard', 'back-on')] : []),
        ],
      },
      2: { actions: [] },
      3: { actions: [cut({})] },
    }),
    flow: [
      {
        id: id(),
        kind: 'alternatives',
        name: 'Saw or router',
        groups: [group([board.steps[1]!.id], 'Saw'), group([board.steps[2]!.id], 'Router')],
      },
    ],
  });

  it('counts the group that leaves the guard off', () => {
    expect(found('guards/open', alternatives(false)).length).toBeGreaterThan(0);
    expect(found('guards/open', alternatives(true))).toEqual([]);
  });

  it('walks a repeated stretch a second time', () => {
    const again: PlanDocument = {
      ...steps({
        1: { actions: [cut({})] },
        2: {
          actions: [
            off,
            guard('blade-guard', 'off'),
            cut({ kind: 'groove', heldBy: ['hold-down'] }),
          ],
        },
        3: { actions: [off, guard('blade-guard', 'back-on')] },
      }),
      flow: [
        {
          id: id(),
          kind: 'repeat',
          fromStepId: board.steps[1]!.id,
          toStepId: board.steps[2]!.id,
          untilCheckId: board.checks[0]!.id,
          atMost: 3,
        },
      ],
    };
    expect(found('guards/open', again).length).toBeGreaterThan(0);
    expect(found('guards/open', { ...again, flow: [] })).toEqual([]);
  });
});
