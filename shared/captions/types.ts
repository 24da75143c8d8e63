/** A word of a cue, with the second at which it is said (kept from the file, or spread over the cue). */
export interface CueWord {
  t: number;
  text: string;
}

/** One caption: seconds from the start of the clip, its words without tags. */
export interface Cue {
  start: number;
  end: number;
  text: string;
  words: CueWord[];
}

export type CaptionFormat = 'vtt' | 'srt' | 'unknown';
export type FaultCode = 'time' | 'order' | 'overlap' | 'header' | 'empty' | 'format' | 'too-many';

/** Something in the file that could not be taken as it stands: what it is, what was done. */
export interface CaptionFault {
  /** Line of the file, from 1. */
  line: number;
  code: FaultCode;
  sentence: string;
  /** Nothing of the file can be used; the sentence says what to do. */
  fatal?: true;
}

export interface Captions {
  format: CaptionFormat;
  cues: Cue[];
  faults: CaptionFault[];
}

/** Words of the captions from the first to the last, both included, as indexes into `cues` and `words`. */
export interface WordsRange {
  from: { cue: number; word: number };
  to: { cue: number; word: number };
}

export type Phase = 'intro' | 'build' | 'demo' | 'outro';
export type MeasureUnit =
  | 'in'
  | 'mm'
  | 'ft'
  | 'deg'
  | 's'
  | 'min'
  | 'h'
  | 'day'
  | 'count'
  | 'screw'
  | 'bolt'
  | 'gauge'
  | 'nominal'
  | 'grit'
  | 'ratio'
  | 'percent'
  | 'lb'
  | 'kg'
  | 'rpm'
  | 'tpi'
  | 'C'
  | 'F';
export type MeasureKind =
  | 'length'
  | 'angle'
  | 'duration'
  | 'fastener'
  | 'abrasive'
  | 'quantity'
  | 'ratio'
  | 'nominal-lumber'
  | 'percentage'
  | 'force'
  | 'weight'
  | 'speed'
  | 'pitch'
  | 'temperature';
export type Qualifier = 'about' | 'less than' | 'at least';

/** What every jotting has: an id that survives another import, the cue's start, the words it came from. */
export interface Heard {
  id: string;
  /** Start of the cue that holds the first word, seconds. */
  t: number;
  text: string;
  wordsRange: WordsRange;
}

/** A measurement spoken. Several numbers that belong together are in `values`, and `value` is null. */
export interface HeardMeasure extends Heard {
  value: number | null;
  values?: number[];
  /** `values` are the two ends of one thing ("ten to fifteen minutes"). */
  range?: true;
  unit: MeasureUnit;
  kind: MeasureKind;
  qualifier: Qualifier | null;
  /** What it is of, as far as the words beside it say: "fence", "thick". */
  refersTo: string | null;
  /** The unit was not said but taken from the talk. */
  unitInferred: boolean;
}

export interface HeardThing extends Heard {
  name: string;
}
export type HeardCaution = Heard;

/** A shop word probably heard wrong. Offered, never applied unasked. */
export interface Correction extends Omit<Heard, 'text'> {
  heard: string;
  meant: string;
  /** The evidence, as a sentence for the screen. */
  why: string;
}

/** A stretch of the clip; `end` is where the next one starts. */
export interface HeardStep {
  id: string;
  start: number;
  end: number;
  title: string;
  phase: Phase;
  wordsRange: WordsRange;
}

export interface Jottings {
  units: 'imperial' | 'metric' | 'mixed';
  /** Seconds: the clip's when it was given, otherwise the end of the last cue. */
  duration: number;
  steps: HeardStep[];
  measures: HeardMeasure[];
  tools: HeardThing[];
  materials: HeardThing[];
  cautions: HeardCaution[];
  corrections: Correction[];
}

export interface JotOptions {
  /** Length of the clip in seconds; nothing is placed after it. */
  duration?: number;
  /** Units of the talk when the maker says so; otherwise found. */
  units?: 'imperial' | 'metric' | 'mixed';
}
