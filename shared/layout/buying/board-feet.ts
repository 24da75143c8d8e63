import { softwoodThickness, softwoodWidth, type Dressed } from '../../trade/lumber.data';

const inch = 25.4;
/** Cubic millimetres in a board foot: 144 cubic inches. */
const boardFoot = 144 * inch ** 3;

/** Inches of a nominal board: thickness × width × length in feet / 12; under one inch counts as one (PS 20). */
export const boardFeet = (thicknessIn: number, widthIn: number, lengthFt: number): number =>
  (Math.max(1, thicknessIn) * widthIn * lengthFt) / 12;

/**
 * As hardwood is tallied (NHLA rules, from memory): the surface W·L/12 to the nearest whole foot, then by the thickness.
 * Not the same as the exact figure, so whoever shows it says which it is.
 */
export const tallyBoardFeet = (thicknessIn: number, widthIn: number, lengthFt: number): number =>
  Math.round((widthIn * lengthFt) / 12) * Math.max(1, thicknessIn);

/** The nominal inches of a dressed softwood board (PS 20, dry), or null when it is none of the standard's. */
export function nominalOf(thicknessMm: number, widthMm: number) {
  const near = (table: readonly Dressed[], mm: number) =>
    table.find(({ nominal, dry }) => nominal >= 1 && Math.abs(dry * inch - mm) <= 0.8)?.nominal ??
    null;
  const [thickness, width] = [near(softwoodThickness, thicknessMm), near(softwoodWidth, widthMm)];
  return thickness === null || width === null ? null : { thickness, width };
}

/** Board feet of a board by its own measures, mm; a dressed softwood board counts as its nominal size. */
export function boardFeetOf(thicknessMm: number, widthMm: number, lengthMm: number): number {
  const nominal = nominalOf(thicknessMm, widthMm);
  const feet = lengthMm / inch / 12;
  return nominal
    ? boardFeet(nominal.thickness, nominal.width, feet)
    : boardFeet(thicknessMm / inch, widthMm / inch, feet);
}

export const cubicMetres = (thicknessMm: number, widthMm: number, lengthMm: number): number =>
  (thicknessMm * widthMm * lengthMm) / 1e9;

/** Cubic metres of so many board feet. */
export const boardFeetToCubicMetres = (feet: number): number => (feet * boardFoot) / 1e9;
