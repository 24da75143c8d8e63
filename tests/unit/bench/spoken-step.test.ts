import { planDocumentSchema, stepSchema } from '../../../shared/plan/document';
import { builtDemoPlans } from '../../../server/demo';
import { spoken, spokenStep } from '../../../shared/plan/spoken-step';

// How makers say figures: the worked phrases of the product's own brief ("two and seven sixteenths",
// "seven forty-two thou", "three and nine sixteenths"); the others are common practice, no source.
const said: [string, string][] = [
  ['Cut it to 2 7/16 in.', 'Cut it to two and seven sixteenths inches.'],
  ['a 3-9/16" strip', 'a three and nine sixteenths inches strip'],
  ['5/8" deep', 'five eighths of an inch deep'],
  ['⅝″ deep', 'five eighths of an inch deep'],
  ['1½ in wide', 'one and one half inches wide'],
  ['0.742 in at the mouth', 'seven forty-two thou at the mouth'],
  ['.005" of play', 'five thou of play'],
  ['1.250"', 'one inch two fifty thou'],
  ['18 mm ply', 'eighteen millimetres ply'],
  ['17.6mm thick', 'seventeen point six millimetres thick'],
  ['1 mm over', 'one millimetre over'],
  ['±0.5 mm', 'plus or minus zero point five millimetres'],
  ['± 1/32 in', 'plus or minus one thirty-second of an inch'],
  ['turn it 45°', 'turn it forty-five degrees'],
  ['#8 × 1 1/4" screws', 'number eight by one and one quarter inches screws'],
  ['600 × 400 × 18 mm', '600 by 400 by eighteen millimetres'],
  ['Leave it 30 min.', 'Leave it thirty minutes.'],
  ['at 4:12 in the clip', 'at 4:12 in the clip'],
  ['Sand to 120 grit', 'Sand to 120 grit'],
  ['Use the MK2 jig', 'Use the MK2 jig'],
];

describe('figures in a sentence', () => {
  it.each(said)('%s', (written, wanted) => {
    expect(spoken(written)).toBe(wanted);
  });
});

describe('a step read aloud', () => {
  const { document } = builtDemoPlans()[0]!.built;

  it('says every step of the demo plans without marks, braces or signs', () => {
    for (const { built } of builtDemoPlans()) {
      for (const step of built.document.steps) {
        const text = spokenStep(step, built.document, () => 'two and three quarters inches').join(
          ' ',
        );
        expect(text).not.toMatch(/[{}*_`#×½¼¾"″]/);
        expect(text).toMatch(/^Step \w/);
      }
    }
  });

  it('says cautions before what to do, and figures as this builder has them', () => {
    const dimension = document.dimensions[0]!;
    const step = stepSchema.parse({
      ...document.steps[0],
      title: 'Rip the bed',
      text: `Set the fence to {{dim:${dimension.id}}} and **rip**.`,
      cautions: [{ id: document.steps[0]!.id, text: 'Riving knife on' }],
      takes: [],
      holds: [dimension.id],
      waits: [
        { ...document.steps[3]!.waits[0], id: dimension.id, minutes: 120, what: 'in clamps' },
      ],
    });
    const plan = planDocumentSchema.parse({ ...document, steps: [step] });
    expect(spokenStep(step, plan, () => 'seventeen point six millimetres')).toEqual([
      'Step one of one.',
      'Rip the bed.',
      'Mind this: Riving knife on.',
      'Set the fence to seventeen point six millimetres and rip.',
      `${dimension.name}: seventeen point six millimetres.`,
      'Wait two hours: in clamps.',
    ]);
    expect(spokenStep(step, plan, () => null).join(' ')).toMatch(/a figure that is not known yet/);
  });
});
