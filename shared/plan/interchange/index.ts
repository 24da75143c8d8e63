import { z } from 'zod';
import { documentVersion, planDocumentSchema, type PlanDocument } from '../document';
import { upgrades, type Upgrade } from '../upgrade';
import { deadReferences } from './dead-references';
import { pathText } from './path-text';

export { deadReferences, type DeadReference } from './dead-references';
export { pathText } from './path-text';

/** One fault of a plan file: where it is, from the root, and what is wrong. */
export interface ImportFault {
  path: string;
  code: string;
  message: string;
}

export type Imported = { ok: true; document: PlanDocument } | { ok: false; faults: ImportFault[] };

const fault = (path: string, code: string, message: string): Imported => ({
  ok: false,
  faults: [{ path, code, message }],
});

/** Ids that stand twice among elements that must differ. */
function repeatedIds(document: PlanDocument): ImportFault[] {
  const seen = new Map<string, string>();
  const faults: ImportFault[] = [];
  const visit = (value: unknown, path: PropertyKey[]): void => {
    if (Array.isArray(value)) value.forEach((item, i) => visit(item, [...path, i]));
    else if (value !== null && typeof value === 'object') {
      for (const [key, inner] of Object.entries(value)) {
        if (key !== 'id' || typeof inner !== 'string') visit(inner, [...path, key]);
        else if (path.length > 0) {
          const here = pathText([...path, 'id']);
          const before = seen.get(inner);
          if (before)
            faults.push({
              path: here,
              code: 'id/repeated',
              message: `This id stands at ${before} as well.`,
            });
          else seen.set(inner, here);
        }
      }
    }
  };
  visit(document, []);
  return faults;
}

/**
 * Reads a plan from what a file held. Everything wrong is listed with its path, and nothing is taken when
 * anything is. A newer version is refused by name; an older one is upgraded.
 */
export function importPlan(
  value: unknown,
  chain: Readonly<Record<number, Upgrade>> = upgrades,
): Imported {
  if (value === null || typeof value !== 'object' || Array.isArray(value))
    return fault('', 'plan/not-one', 'This is not a plan: a plan file is one JSON object.');
  let document = value as Record<string, unknown>;
  let version = document.scantling;
  if (typeof version !== 'number' || !Number.isInteger(version) || version < 1) {
    return fault('scantling', 'plan/version', 'The plan does not say its version: "scantling": 1.');
  }
  if (version > documentVersion) {
    return fault(
      'scantling',
      'plan/newer',
      `The plan is of version ${version}; this program reads up to ${documentVersion}. Bring the program up to date.`,
    );
  }
  while (typeof version === 'number' && version < documentVersion) {
    const upgrade = chain[version];
    if (!upgrade)
      return fault('scantling', 'plan/version', `There is no way from version ${version}.`);
    document = upgrade(document);
    version += 1;
  }
  const parsed = planDocumentSchema.safeParse(document);
  if (!parsed.success) {
    return {
      ok: false,
      faults: parsed.error.issues.map((i) => ({
        path: pathText(i.path),
        code: i.code,
        message: i.message,
      })),
    };
  }
  const faults = [
    ...repeatedIds(parsed.data),
    ...deadReferences(parsed.data).map(({ path, what }) => ({
      path,
      code: 'reference/dead',
      message: `There is no ${what} with this id.`,
    })),
  ];
  return faults.length > 0 ? { ok: false, faults } : { ok: true, document: parsed.data };
}

/** A plan as the text of a file. Importing it gives the same plan. */
export const exportPlan = (document: PlanDocument): string =>
  `${JSON.stringify(document, null, 2)}\n`;

/** The published JSON Schema (2020-12) of a plan file. */
export function planJsonSchema(): Record<string, unknown> {
  return {
    ...z.toJSONSchema(planDocumentSchema, { target: 'draft-2020-12', io: 'input' }),
    $id: 'https://scantling.example/plan.schema.json',
    title: 'A plan',
  };
}
