import { type Finding, type Rule } from '../rule';

/** Walks the steps in order: a step that loads a joint must come after every wait that is still open. */
export const timeCure: Rule = {
  id: 'time/cure',
  level: 'must',
  source: 'glue labels: a joint is not loaded before its clamp time is over',
  run: ({ document }) => {
    const found: Finding[] = [];
    let clock = 0;
    let open: { until: number; step: number }[] = [];
    document.steps.forEach((step, i) => {
      if (step.loadsJoint) {
        const early = open.find((w) => w.until > clock);
        if (early) {
          found.push({
            place: { in: 'steps', elementId: step.id },
            message: `Step ${i + 1} loads a joint while the wait of step ${early.step} still has ${Math.ceil(early.until - clock)} min to run.`,
            cure: `Let step ${early.step} hold the next one up, or move step ${i + 1} back.`,
          });
        }
      }
      clock += step.handsOn;
      for (const wait of step.waits)
        if (wait.kind === 'clamp' || wait.kind === 'cure')
          open.push({ until: clock + wait.minutes, step: i + 1 });
      clock += step.waits.reduce((m, w) => (w.nextMayStart ? m : Math.max(m, w.minutes)), 0);
      open = open.filter((w) => w.until > clock);
    });
    return found;
  },
};
