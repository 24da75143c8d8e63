import { type TermSide } from '../measure';
import { type MachineClass } from '../plan/document';

type Names = readonly [us: string, uk: string];

/** What a machine is called on each side of the water. A planer is never named without the switch deciding. */
const names: Record<MachineClass, Names> = {
  'table-saw': ['table saw', 'table saw'],
  'track-saw': ['track saw', 'plunge saw'],
  'circular-saw': ['circular saw', 'circular saw'],
  'mitre-saw': ['miter saw', 'mitre saw'],
  bandsaw: ['bandsaw', 'bandsaw'],
  jigsaw: ['jigsaw', 'jigsaw'],
  router: ['router', 'router'],
  'router-table': ['router table', 'router table'],
  drill: ['drill', 'drill'],
  'drill-press': ['drill press', 'pillar drill'],
  jointer: ['jointer', 'planer'],
  planer: ['planer', 'thicknesser'],
  sander: ['sander', 'sander'],
  lathe: ['lathe', 'lathe'],
  grinder: ['grinder', 'grinder'],
  'hand-tool': ['hand tool', 'hand tool'],
};

export const machineName = (machine: MachineClass, side: TermSide): string =>
  names[machine][side === 'us' ? 0 : 1];
