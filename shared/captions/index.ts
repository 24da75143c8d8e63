/** What others call: read a caption file, and jot down what it says. */
export {
  readCaptions,
  toVtt,
  vttTime,
  plainText,
  type Captions,
  type CaptionFault,
  type Cue,
} from './read';
export { heardMeasures, type HeardMeasure } from './measures';
export { draftSteps, titleFrom, type DraftStep } from './steps';
