/** What others call: read a caption file, and jot down what it says. */
export { readCaptions, toVtt } from './read/read';
export { plainText } from './read/cue-text';
export { vttTime } from './read/time';
export { jot } from './jot';
export { matchJottings } from './match';
export { heardIn, toDraft, type DraftStep, type HeardStretch } from './draft';
export type {
  CaptionFault,
  CaptionFormat,
  Captions,
  Correction,
  Cue,
  CueWord,
  HeardCaution,
  HeardMeasure,
  HeardStep,
  HeardThing,
  JotOptions,
  Jottings,
  MeasureKind,
  MeasureUnit,
  Phase,
  Qualifier,
  WordsRange,
} from './types';
