import { documentVersion, planDocumentSchema, type PlanDocument } from './document';

/** One step of the chain: what a document of version n becomes in n + 1. Frozen bytes never change. */
export type Upgrade = (document: Record<string, unknown>) => Record<string, unknown>;

/** By the version they start from. There is only one version so far. */
export const upgrades: Readonly<Record<number, Upgrade>> = {};

/** A stored document as today's shape, upgraded on reading. Throws when it is newer than this program. */
export function readDocument(
  stored: unknown,
  chain: Readonly<Record<number, Upgrade>> = upgrades,
): PlanDocument {
  let document = stored as Record<string, unknown>;
  let version = Number(document.scantling);
  if (!(version <= documentVersion))
    throw new Error(
      `This plan is of version ${String(document.scantling)}; this program reads up to ${documentVersion}.`,
    );
  while (version < documentVersion) {
    const upgrade = chain[version];
    if (!upgrade) throw new Error(`There is no way from version ${version}.`);
    document = upgrade(document);
    version += 1;
  }
  return planDocumentSchema.parse(document);
}
