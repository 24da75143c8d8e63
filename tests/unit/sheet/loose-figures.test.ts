import { looseFigures } from '../../../shared/plan/sheet/loose-figures';

const found = (text: string, names: string[] = []) => looseFigures(text, names).map((f) => f.text);

// Common practice, no source: how shop texts write sizes, and how they write names.
it.each<[string, string[]]>([
  ['Cut the base to 23 7/8 in.', ['23 7/8 in']],
  ['Rip it 1½ in wide.', ['1½ in']],
  ['Set the fence to 18mm and the depth to 6.5 mm.', ['18mm', '6.5 mm']],
  ['Mark 3/4" in from the edge.', ['3/4"']],
  ['Cut a 12-inch length.', ['12-inch']],
  ['Cut A to 300 mm x 200 mm.', ['300 mm', '200 mm']],
  ['Leave 742 thou.', ['742 thou']],
  ['A hole 15 mm deep, 40 mm from the end.', ['15 mm', '40 mm']],
  ['A groove 4 in from the end.', ['4 in']],
])('finds the figures of “%s”', (text, figures) => {
  expect(found(text)).toEqual(figures);
});

it.each([
  'Drill with a 5/64 in bit, about 1/2 in deep. Sand to 120 grit.',
  'Drive four 4 mm x 50 mm screws.',
  'Use the 1/4 in round-over bit at 18000 rev/min.',
  'Lay a 600 mm straight edge along it.',
  'A sheet of 18 mm birch ply.',
  'Drive 4 in each side and 2 in the end.',
  'Wait 30 min, then turn it 90 degrees.',
  'Feed at 4 m/min.',
  'Within 0.5 mm is good enough. Roughly 10 mm proud.',
  'Keep your hands 150 mm from the blade.',
  'Cut four {{part:00000000-0000-7000-8000-000000000001}} to {{dim:00000000-0000-7000-8000-000000000002}}.',
  'Fit the 8 mm dowels and the 1/4 in bolts.',
  'Two coats, 24 h between. 3 of them. Step 12 in order.',
  'Cut the two-by-four; No. 8 screws.',
])('lets names, counts and rough figures be: “%s”', (text) => {
  expect(found(text)).toEqual([]);
});

it('lets be what the creator calls a name', () => {
  expect(found('Cut it to 12 in.', ['12 in'])).toEqual([]);
});
