import { type Rule } from '../rule';
import { checksVerdict } from './checks-verdict';
import { dimsResolve } from './dims-resolve';
import { dimsUntaken } from './dims-untaken';
import { dimsUnused } from './dims-unused';
import { linksDisclosure } from './links-disclosure';
import { mediaAlt } from './media-alt';
import { mediaCaptions } from './media-captions';
import { mediaStretch } from './media-stretch';
import { partsMade } from './parts-made';
import { partsUsed } from './parts-used';
import { planSteps } from './plan-steps';
import { textEmpty } from './text-empty';
import { textLong } from './text-long';
import { timeCure } from './time-cure';

/** The rules in the order of the sheet. Adding a rule is adding a file and its line here. */
export const rules: readonly Rule[] = [
  planSteps,
  dimsResolve,
  dimsUntaken,
  checksVerdict,
  textEmpty,
  textLong,
  partsMade,
  partsUsed,
  linksDisclosure,
  mediaAlt,
  mediaCaptions,
  mediaStretch,
  timeCure,
  dimsUnused,
];
