import { actionsOf, atStep, wordsOf } from '../actions';
import { saysSo } from '../words';
import { type Rule } from '../rule';

const fenceAsStop =
  /\b(?:rip )?fence\b[^.]{0,40}\b(?:as|for|is|be|becomes?) (?:a |the |your |our )?(?:length )?(?:stop|gauge)\b/;
const standOff = /\bstand.?off\b|\bblock\b/;

export const safetyLengthStop: Rule = {
  id: 'safety/length-stop',
  level: 'must',
  source: 'common practice, no source in government text; several machine manuals say exactly this',
  run: ({ document }) =>
    actionsOf(document, 'cut').flatMap(({ action, step, number }) => {
      if (action.kind !== 'through-crosscut' || action.machine !== 'table-saw') return [];
      const words = wordsOf(step);
      const inWords =
        action.lengthStop === 'none' && saysSo(words, fenceAsStop) && !standOff.test(words);
      return action.lengthStop === 'rip-fence' || inWords
        ? [
            atStep(
              step,
              `Step ${number} uses the rip fence as a length stop: the offcut is caught and kicks back.`,
              'Clamp a stand-off block to the fence so that the work leaves it before it meets the blade.',
            ),
          ]
        : [];
    }),
};
