/** Colour values for day and night, role by role. What each role is for stands beside it. */
export const palettes = {
  day: {
    film: '#F3F5F4', // page ground
    sheet: '#FCFDFC', // raised ground: inputs, part marks, stick
    well: '#E6EBE9', // still frames, hover, keypad fraction keys
    ink: '#1C2226', // text and thick lines
    ink2: '#434D53', // secondary text
    ink3: '#566067', // quiet text, disabled
    ruleThin: '#C3CBC9', // row separators
    rule: '#778286', // input and tag outlines
    ruleThick: '#1C2226', // section and screen rules
    blue: '#1D43B8', // accent: links, current place, primary button
    bluePressed: '#15338F', // primary button hover and pressed
    blueWash: '#E7EDFA', // chosen row, current stretch
    onBlue: '#FFFFFF', // text on blue
    dye: '#1D43B8', // done stretch of the stick
    scribe: '#FFFFFF', // marks on dye
    holds: '#1C6B47', // shape fill
    holdsText: '#14563A', // verdict word
    holdsWash: '#DCECE3', // band, banner
    risk: '#A86A00', // shape fill
    riskText: '#6B4300', // verdict word
    riskWash: '#F6E8CC', // banner
    fails: '#B93A17', // shape fill
    failsText: '#86280E', // verdict word
    failsWash: '#F8DFD6', // banner
    need: '#1C2226', // ring
    needText: '#1C2226', // verdict word
    needWash: '#E6EBE9', // banner
    focus: '#1D43B8', // focus ring
    scrim: '#1C2226', // behind a dialog, solid
  },
  night: {
    film: '#12171A',
    sheet: '#1A2125',
    well: '#252D32',
    ink: '#EDF1EF',
    ink2: '#C3CCCB',
    ink3: '#A3AEB0',
    ruleThin: '#38424A',
    rule: '#7D8A90',
    ruleThick: '#EDF1EF',
    blue: '#9DB8FF',
    bluePressed: '#BFD0FF',
    blueWash: '#1E2B4E',
    onBlue: '#0E1430',
    dye: '#5B82F2',
    scribe: '#0C1116',
    holds: '#58BE8E',
    holdsText: '#86D7AE',
    holdsWash: '#173026',
    risk: '#E3A43A',
    riskText: '#F3C271',
    riskWash: '#352A12',
    fails: '#F37B55',
    failsText: '#FFAB90',
    failsWash: '#3B1F15',
    need: '#EDF1EF',
    needText: '#EDF1EF',
    needWash: '#252D32',
    focus: '#9DB8FF',
    scrim: '#05080A',
  },
} as const;

export type Palette = typeof palettes.day;
export type ColourRole = keyof Palette;
export type ThemeName = keyof typeof palettes;

type Pair = readonly [text: ColourRole, ground: ColourRole];
/** Text on grounds: at least 4.5:1 in both themes. */
export const textPairs: Pair[] = [
  ['ink', 'film'],
  ['ink', 'sheet'],
  ['ink', 'well'],
  ['ink2', 'film'],
  ['ink2', 'sheet'],
  ['ink3', 'film'],
  ['ink3', 'sheet'],
  ['blue', 'film'],
  ['blue', 'sheet'],
  ['blue', 'blueWash'],
  ['ink', 'blueWash'],
  ['onBlue', 'blue'],
  ['onBlue', 'bluePressed'],
  ['scribe', 'dye'],
  ['holdsText', 'film'],
  ['holdsText', 'holdsWash'],
  ['riskText', 'film'],
  ['riskText', 'riskWash'],
  ['failsText', 'film'],
  ['failsText', 'failsWash'],
  ['failsText', 'sheet'],
  ['needText', 'needWash'],
  ['film', 'ink'],
  ['ink', 'failsWash'],
  ['ink', 'riskWash'],
  ['ink', 'holdsWash'],
];

/** Shapes and outlines on grounds: at least 3:1 in both themes. */
export const graphicPairs: Pair[] = [
  ['holds', 'film'],
  ['risk', 'film'],
  ['fails', 'film'],
  ['rule', 'film'],
  ['rule', 'sheet'],
  ['focus', 'film'],
  ['dye', 'sheet'],
];

/** Text pairs allowed at the bench: at least 7:1 in both themes. */
export const benchPairs: Pair[] = [
  ['ink', 'film'],
  ['ink', 'sheet'],
  ['ink', 'well'],
  ['ink', 'blueWash'],
  ['ink2', 'film'],
  ['ink2', 'sheet'],
  ['ink2', 'well'],
  ['ink2', 'blueWash'],
  ['blue', 'film'],
  ['blue', 'sheet'],
  ['blue', 'blueWash'],
  ['holdsText', 'film'],
  ['holdsText', 'sheet'],
  ['holdsText', 'well'],
  ['holdsText', 'blueWash'],
  ['riskText', 'film'],
  ['riskText', 'sheet'],
  ['riskText', 'well'],
  ['riskText', 'blueWash'],
  ['failsText', 'film'],
  ['failsText', 'sheet'],
  ['failsText', 'well'],
  ['failsText', 'blueWash'],
  ['needText', 'film'],
  ['needText', 'sheet'],
  ['needText', 'well'],
  ['needText', 'blueWash'],
  ['holdsText', 'holdsWash'],
  ['riskText', 'riskWash'],
  ['failsText', 'failsWash'],
  ['ink', 'holdsWash'],
  ['ink', 'riskWash'],
  ['ink', 'failsWash'],
  ['onBlue', 'blue'],
  ['film', 'ink'],
];
