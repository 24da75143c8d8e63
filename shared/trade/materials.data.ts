/**
 * Materials that ask for a word of care: how they are recognised, what is the matter, which words of the plan show that it
 * is said, and the cure. OSHA, NIOSH and ACGIH pages on wood dust (read: 1 mg/m³, cedar 0.5); the rest common practice.
 */
export const careMaterials: readonly {
  match: RegExp;
  what: string;
  needs: RegExp;
  cure: string;
}[] = [
  {
    match: /\bmdf\b|fibreboard|fiberboard/,
    what: 'its dust is very fine',
    needs: /\b(?:dust|mask|respirator|extract)/,
    cure: 'Say that dust is extracted and a mask worn.',
  },
  {
    match: /\btreated\b|pressure.?treated|railway sleeper/,
    what: 'its dust and smoke are poisonous',
    needs: /\b(?:mask|respirator|burn|gloves)/,
    cure: 'Say: mask on, never burn the offcuts.',
  },
  {
    match: /\breclaimed\b|\bpallets?\b|salvaged/,
    what: 'nails may be in it',
    needs: /\b(?:nails?|metal|detector)\b/,
    cure: 'Say that nails are looked for before it meets a blade.',
  },
  {
    match: /\b(?:(?:red)?cedar|rosewood|cocobolo|iroko|wenge|yew)\b/,
    what: 'it can sensitise skin and lungs',
    needs: /\b(?:mask|respirator|dust|skin)/,
    cure: 'Say: mask on, dust extracted, skin covered.',
  },
];
