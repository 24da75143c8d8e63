import { parseArgs } from 'node:util';
import { aids } from '../../shared/aids';
import { type AnyAid } from '../../shared/aids/aid';

export const name = 'aid';
export const summary = "Work out a bench aid: aid NAME --json '{…}'; aid --list names them.";

/** The inputs of an aid on one line, optional ones in brackets. */
function inputs(aid: AnyAid): string {
  const schema = aid.schema() as {
    properties?: Record<string, unknown>;
    required?: string[];
    anyOf?: { properties?: Record<string, unknown>; required?: string[] }[];
    oneOf?: { properties?: Record<string, unknown>; required?: string[] }[];
  };
  return (schema.oneOf ?? schema.anyOf ?? [schema])
    .map(({ properties = {}, required = [] }) =>
      Object.keys(properties)
        .map((key) => (required.includes(key) ? key : `[${key}]`))
        .join(' '),
    )
    .join(' | ');
}

/** Every aid with its inputs as JSON Schema, and an input that works. */
const listed = () =>
  aids.map(({ id, title, what, sources, example, schema }) => ({
    name: id,
    title,
    what,
    sources,
    example,
    inputs: schema(),
  }));

function list(json: boolean): number {
  if (json) {
    console.log(JSON.stringify(listed(), null, 1));
    return 0;
  }
  for (const aid of aids) {
    console.log(`${aid.id.padEnd(18)} ${aid.title}: ${aid.what}`);
    console.log(`${' '.repeat(19)}inputs: ${inputs(aid)}`);
    console.log(`${' '.repeat(19)}example: ${JSON.stringify(aid.example)}`);
  }
  return 0;
}

/** Lengths in mm, temperatures in °C, times in minutes, forces in N. 0 worked out, 1 refused, 2 no such aid or no JSON. */
export async function run(argv: string[]): Promise<number> {
  if (argv.includes('--list')) return list(argv.includes('--json'));
  const { values, positionals } = parseArgs({
    args: argv,
    allowPositionals: true,
    options: { json: { type: 'string' } },
  });
  const [id] = positionals;
  if (id === undefined) return list(false);
  const aid = aids.find((each) => each.id === id);
  if (!aid) {
    console.error(`There is no aid ${id}. aid --list names them.`);
    return 2;
  }
  let input: unknown;
  try {
    input = JSON.parse(values.json ?? 'null');
  } catch {
    console.error('What follows --json is no JSON. Put it in single quotes.');
    return 2;
  }
  const outcome = aid.run(input);
  console.log(JSON.stringify({ ...outcome, sources: aid.sources }, null, 2));
  return Promise.resolve(outcome.ok ? 0 : 1);
}
