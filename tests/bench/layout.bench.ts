import { barsTable } from './bars.bench';
import { packers, sawable } from './layout-packers';
import { type Instance, type Row, row, type SetFile, setsOf, type Way } from './layout-sets';
import { conditions, report, table } from './write-section';

const sum = <T>(list: readonly T[], of: (each: T) => number): number =>
  list.reduce((total, each) => total + of(each), 0);
const mean = (rows: readonly Row[], of: (row: Row) => number): number =>
  rows.length === 0 ? 0 : sum(rows, of) / rows.length;

type Line = (string | number)[];

const cost = (r: Row) => r.answer.cost;
const atMost = (reached: number, limit: string) =>
  limit === '' ? '' : reached <= Number(limit) ? 'yes' : 'no';
const longest = (rows: readonly Row[]) => Math.max(0, ...rows.map((r) => r.ms)).toFixed(0);
const provenShare = (rows: readonly Row[]) =>
  `${((100 * rows.filter((r) => r.answer.proven).length) / rows.length).toFixed(1)} %`;

/** Published targets hold for the open half of the sets only. */
interface Target {
  must: string;
  goal: string;
}
const none: Target = { must: '', goal: '' };
const half = (instances: readonly Instance[], count: number, target: Target): Target =>
  instances.length === count ? target : none;

function counted(name: string, rows: Row[], { must, goal }: Target): Line {
  const reached = sum(rows, cost);
  const best = rows.some((r) => r.best === null) ? '' : sum(rows, (r) => r.best ?? 0);
  const bound = sum(rows, (r) => r.answer.lowerBound);
  const judged = must === '' ? '' : `${atMost(reached, must)} / ${atMost(reached, goal)}`;
  return [
    name,
    rows.length,
    reached,
    must,
    goal,
    judged,
    best,
    bound,
    provenShare(rows),
    longest(rows),
  ];
}

const run = (instances: readonly Instance[], way: Way): Row[] => instances.map((i) => row(i, way));

const counting = [
  'set',
  'n',
  'reached',
  'must',
  'goal',
  'must / goal met',
  'best known',
  'bound',
  'proven',
  'longest, ms',
];
const quick = 45;

function bwmv({ instances }: SetFile, time: number): string {
  const lines: Line[] = [];
  const packed: Line[] = [];
  for (const turn of [false, true]) {
    const word = turn ? 'turned' : 'as they lie';
    const slow = run(instances, { time, turn, options: { offcut: false } });
    const fast = run(instances, { time: quick, turn, options: { offcut: false } });
    const target = turn ? { must: '3420', goal: '3406' } : { must: '3530', goal: '3522' };
    const soon = turn ? { must: '3454', goal: '' } : { must: '3551', goal: '' };
    lines.push(counted(`2d-bwmv, ${word}`, slow, half(instances, 250, target)));
    lines.push(counted(`the same, quick (${quick} ms)`, fast, half(instances, 250, soon)));
    for (const [name, pack] of Object.entries(packers)) {
      const sheets = fast.map((r) => pack(r.job));
      const total = sum(sheets, (s) => s.length);
      const sawn = sheets.flat().filter(sawable).length;
      packed.push([name, word, total, sum(fast, cost), `${((100 * sawn) / total).toFixed(1)} %`]);
    }
  }
  const head = ['npm packer', 'parts', 'its sheets', 'ours, quick', 'of its sheets sawable'];
  return `${table(counting, lines)}\n\n${table(head, packed)}`;
}

function workshop({ file, instances }: SetFile, time: number): string {
  const rows = run(instances, { time });
  const best = rows.filter((r) => cost(r) === r.best).length;
  const over = Math.max(...rows.map((r) => cost(r) - (r.best ?? 0)));
  const target = half(instances, 20, { must: '18, 1 over', goal: '20' });
  const line = [
    file,
    rows.length,
    `${best} optimal, ${over} over`,
    target.must,
    target.goal,
    provenShare(rows),
    longest(rows),
  ];
  return table(['set', 'n', 'reached', 'must', 'goal', 'proven', 'longest, ms'], [line]);
}

function groups(instances: readonly Instance[], letters: number): Map<string, Instance[]> {
  const found = new Map<string, Instance[]>();
  for (const each of instances) {
    const key = each.name.slice(0, letters);
    found.set(key, [...(found.get(key) ?? []), each]);
  }
  return found;
}

function hopper({ instances }: SetFile, time: number): string {
  const targets: Record<string, Target> = {
    M1: { must: '98.3', goal: '98.4' },
    M2: { must: '95.6', goal: '97.0' },
    M3: { must: '96.5', goal: '97.5' },
  };
  const lines = [...groups(instances, 2)].map(([key, list]): Line => {
    const rows = run(list, { time });
    const { must, goal } = targets[key] ?? none;
    const most = mean(rows, (r) => (r.use * cost(r)) / r.answer.lowerBound);
    return [
      `hopper ${key}`,
      rows.length,
      mean(rows, (r) => r.use).toFixed(2),
      must,
      goal,
      most.toFixed(2),
      longest(rows),
    ];
  });
  return table(
    ['use of sheets, %', 'n', 'reached', 'must', 'goal', 'at most (bound)', 'longest, ms'],
    lines,
  );
}

function strip({ instances }: SetFile, time: number): string {
  const targets: Record<string, Target> = {
    C: { must: '3.3', goal: '2' },
    N: { must: '2.0', goal: '1' },
    T: { must: '7.5', goal: '3' },
  };
  const lines = [...groups(instances, 1)].map(([key, list]): Line => {
    const rows = run(list, { time: 2 * time, unlimited: true });
    const { must, goal } = targets[key] ?? none;
    const excess = 100 * mean(rows, (r) => r.strips - 1);
    return [`strip ${key}`, rows.length, excess.toFixed(2), must, goal, longest(rows)];
  });
  return table(['mean excess, %', 'n', 'reached', 'must', 'goal', 'longest, ms'], lines);
}

function other({ file, instances }: SetFile, time: number): Line {
  return counted(file, run(instances, { time }), none);
}

function main(folder: string, time: number): string {
  const { sets, others } = setsOf(folder);
  const parts: string[] = [];
  const rest: Line[] = [];
  for (const set of sets) {
    if (set.file.includes('bwmv')) parts.push(bwmv(set, time));
    else if (set.file.includes('workshop')) parts.push(workshop(set, time));
    else if (set.file.includes('hopper')) parts.push(hopper(set, time));
    else if (set.file.includes('strip')) parts.push(strip(set, time));
    else rest.push(other(set, time));
  }
  if (rest.length > 0) parts.push(table(counting, rest));
  const bars = barsTable(folder);
  if (bars.split('\n').length > 2) parts.push(bars);
  if (others.length > 0) parts.push(`Left out, no job of this kind: ${others.join(', ')}.`);
  return parts.join('\n\n');
}

const args = process.argv.slice(2);
const folder = args.find((arg) => !arg.startsWith('-') && !/^\d+$/.test(arg));
if (!folder) throw new Error('npm run -s bench:layout -- FOLDER [--time MS] [--write]');
const time = args.includes('--time') ? Number(args[args.indexOf('--time') + 1]) : 900;
const intro = `## Layouts

\`npm run -s bench:layout -- FOLDER\`: ${time} ms for each instance (offcuts twice that), one call each, one core, seed 1; every answer
replayed by the verifier, which found no fault. Must and goal hold for the open half of the published sets.`;
report('layout', `${intro}\n\n${main(folder, time)}\n\n${conditions()}`);
