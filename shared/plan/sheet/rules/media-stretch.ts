import { type Finding, type Rule } from '../rule';

export const mediaStretch: Rule = {
  id: 'media/stretch',
  level: 'should',
  source: 'plan model §7: stretches lie inside the clip, in order',
  run: ({ document }) => {
    if (document.clip.source === 'none') return [];
    const { duration } = document.clip;
    let before = 0;
    return document.steps.flatMap((step, i): Finding[] => {
      const found = (message: string, cure: string): Finding[] => [
        { place: { in: 'steps', elementId: step.id }, message, cure },
      ];
      const marks = 'Set its in and out marks again.';
      if (step.stretches.some((s) => s.end <= s.start))
        return found(`The stretch of step ${i + 1} ends before it begins.`, marks);
      if (step.stretches.some((s) => s.end > duration + 0.5))
        return found(`The stretch of step ${i + 1} runs past the end of the clip.`, marks);
      const disorder = step.stretches.some((s, n) => s.start < (step.stretches[n - 1]?.start ?? 0));
      if (disorder)
        return found(
          `The stretches of step ${i + 1} are out of order.`,
          'Put them in the order of the clip.',
        );
      const first = step.stretches[0]?.start;
      if (step.phase !== 'build' || first === undefined) return [];
      const back = first < before - 0.5;
      before = first;
      return back
        ? found(
            `The clip of step ${i + 1} lies before that of the step above it.`,
            'Check its marks, or say why the order of the steps is another.',
          )
        : [];
    });
  },
};
