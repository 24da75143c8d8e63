import { type MachineClass } from '../plan/document';

const loud = 'Eyes and ears covered, dust caught or a mask on.';
const eyes = 'Eyes covered.';
const dusty = 'Eyes covered, dust caught or a mask on.';

/**
 * What the product itself says where a machine is first used. Eyes 29 CFR 1910.133, ears 1910.95, dust: NIOSH REL 1 mg/m³
 * (read); which machine asks for which is common practice, no source. The machine's manual wins.
 */
export const eyeEarDust: Readonly<Record<MachineClass, string>> = {
  'table-saw': loud,
  'track-saw': loud,
  'circular-saw': loud,
  'mitre-saw': loud,
  bandsaw: loud,
  jigsaw: loud,
  router: loud,
  'router-table': loud,
  drill: eyes,
  'drill-press': eyes,
  jointer: loud,
  planer: loud,
  sander: dusty,
  lathe: dusty,
  grinder: eyes,
  'hand-tool': '',
};

/** Near anything that turns; common practice, machine manuals. */
export const looseClothing = 'No gloves, loose sleeves, jewellery or loose hair near what turns.';
