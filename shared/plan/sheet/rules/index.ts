import { type Rule } from '../rule';
import { checksVerdict } from './checks-verdict';
import { dimsLooseFigure } from './dims-loose-figure';
import { dimsKind, dimsLoop, dimsUnknown } from './dims-resolve';
import { dimsUnlikely } from './dims-unlikely';
import { dimsUntaken } from './dims-untaken';
import { dimsUnused } from './dims-unused';
import {
  fastenersBite,
  fastenersInCut,
  fastenersPilot,
  fastenersThrough,
} from './fasteners-lengths';
import { guardsExit } from './guards-exit';
import { guardsOpen } from './guards-open';
import { guardsPower } from './guards-power';
import { linksDisclosure } from './links-disclosure';
import { machineRegion } from './machine-region';
import { mediaAlt } from './media-alt';
import { mediaCaptions } from './media-captions';
import { mediaStretch } from './media-stretch';
import { movementSeason } from './movement-season';
import { partsMade } from './parts-made';
import { layoutEnough, partsFitsStock, partsQuantity, partsThickness } from './parts-stock';
import { partsUsed } from './parts-used';
import { planSteps } from './plan-steps';
import { safetyCoast } from './safety-coast';
import { safetyConfined } from './safety-confined';
import { safetyFinish } from './safety-finish';
import { safetyLengthStop } from './safety-length-stop';
import { safetyEyeEarDust, safetyLooseClothing } from './safety-lines';
import { safetyMaterial } from './safety-material';
import { safetyMinimumLength } from './safety-minimum-length';
import { safetyOverhead } from './safety-overhead';
import { safetyRouter } from './safety-router';
import { safetySmallWork } from './safety-small-work';
import { safetyWorkholding } from './safety-workholding';
import { textEmpty } from './text-empty';
import { textLong } from './text-long';
import { timeCure } from './time-cure';

/** The rules in the order of the sheet. Adding a rule is adding a file and its line here. */
export const rules: readonly Rule[] = [
  planSteps,
  dimsUnknown,
  dimsLoop,
  dimsKind,
  dimsUntaken,
  dimsUnlikely,
  dimsLooseFigure,
  dimsUnused,
  checksVerdict,
  partsMade,
  partsQuantity,
  partsFitsStock,
  partsUsed,
  partsThickness,
  layoutEnough,
  fastenersThrough,
  fastenersInCut,
  fastenersBite,
  fastenersPilot,
  movementSeason,
  guardsOpen,
  guardsExit,
  guardsPower,
  safetyCoast,
  safetyConfined,
  safetyLengthStop,
  safetySmallWork,
  safetyMinimumLength,
  safetyWorkholding,
  safetyRouter,
  safetyEyeEarDust,
  safetyLooseClothing,
  safetyFinish,
  safetyMaterial,
  safetyOverhead,
  machineRegion,
  timeCure,
  mediaStretch,
  mediaAlt,
  mediaCaptions,
  linksDisclosure,
  textEmpty,
  textLong,
];
