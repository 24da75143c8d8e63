/**
 * From a plan to what is cut of what: `cutList(model)` for the table, `stockJobs(model, settings)` for what to cut from each
 * stock on the sizes and with the kerf the person has, `layBars` for boards, strips and rod. Lengths in mm. Pure.
 */
export { cutList } from './cut-list';
export { partsWithoutStock, stockJobs } from './jobs';
export { layBars, pricesOf } from './lay-bars';
export { staveAllowance, stavesOf } from './staves';
export type * from './types';
