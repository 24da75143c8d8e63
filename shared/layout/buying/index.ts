/** The buying list: stock as laid out, hardware in packs, consumables by coverage; CSV that no spreadsheet takes for formulas. Pure. */
export { buyingList, type BuyingLine, type BuyingList, type BuyingSettings } from './list';
export { cheapestPacks, type Pack, type PackChoice } from './packs';
export { type Coverage, surfaceOf, tinsFor } from './coverage';
export {
  boardFeet,
  boardFeetOf,
  boardFeetToCubicMetres,
  cubicMetres,
  nominalOf,
  tallyBoardFeet,
} from './board-feet';
export { csv } from './csv';
