import { z } from 'zod';
import { metricPlywoodLimits, plywoodTolerance } from '../../trade/lumber';
import { plywoodCategories } from '../../trade/lumber.data';
import { defineAid } from '../aid';
import { refused, type Outcome } from '../outcome';

const inch = 25.4;

export const sheetThicknessInput = z.object({
  /** PS 1 category in inches, or EN 315 nominal in mm. */
  standard: z.enum(['ps1', 'en315']),
  /** As 23/32, 1 1/8; or the nominal millimetres. */
  category: z.union([z.string().max(10), z.number()]),
  sanded: z.boolean(),
  /** The sheet in hand, mm, and how sure. */
  measured: z.number().positive().max(100).optional(),
  uncertainty: z.number().min(0).max(5).default(0.03),
});

export interface SheetThicknessResult {
  /** mm. */
  nominal: number;
  least: number;
  greatest: number;
  /** Of the sheet in hand: inside, outside, or too near a limit for this instrument. */
  verdict: 'inside' | 'near' | 'outside' | null;
}

/** The value of a category such as `1 1/8` or `23/32`, inches. */
export const categoryInches = (text: string): number =>
  text
    .split(' ')
    .map((word) => word.split('/').map(Number))
    .reduce((sum, [top = 0, bottom = 1]) => sum + top / bottom, 0);

function limits(input: z.output<typeof sheetThicknessInput>): Outcome<[number, number, number]> {
  const { category, sanded } = input;
  if (input.standard === 'ps1') {
    const row = plywoodCategories.find((c) => c.category === String(category));
    if (!row)
      return refused(
        'category',
        'PS 1 has no such category.',
        'Read the stamp: 1/4, 15/32, 23/32 …',
      );
    const size = categoryInches(row.category);
    const off = plywoodTolerance(size, true);
    const [least, greatest] = sanded ? [size - off, size + off] : [row.least, row.greatest];
    return { ok: true, result: [size * inch, least * inch, greatest * inch] };
  }
  const mm = Number(category);
  if (!(mm >= 3 && mm <= 50))
    return refused(
      'category',
      'EN 315 is used here for 3 to 50 mm.',
      'Give the nominal thickness in millimetres.',
    );
  const { over, under } = metricPlywoodLimits(mm, sanded);
  return { ok: true, result: [mm, mm - under, mm + over] };
}

/** How thick a sheet of a category may be, and whether the one in hand is inside. */
export function workSheetThickness(
  input: z.output<typeof sheetThicknessInput>,
): Outcome<SheetThicknessResult> {
  const found = limits(input);
  if (!found.ok) return found;
  const [nominal, least, greatest] = found.result;
  const { measured, uncertainty: u } = input;
  const verdict =
    measured === undefined
      ? null
      : measured - u >= least && measured + u <= greatest
        ? 'inside'
        : measured + u < least || measured - u > greatest
          ? 'outside'
          : 'near';
  return { ok: true, result: { nominal, least, greatest, verdict } };
}

/** The aid "Thickness of a sheet". */
export const sheetThicknessAid = defineAid({
  id: 'sheet-thickness',
  title: 'Thickness of a sheet',
  what: 'How thick a sheet of its category may be, and whether yours is.',
  sources:
    'PS 1 as its producers’ association prints it; EN 315 (sanded read in GB/T 9846.3, unsanded from memory).',
  example: { standard: 'ps1', category: '23/32', sanded: false, measured: 17.9 },
  input: sheetThicknessInput,
  work: workSheetThickness,
});
