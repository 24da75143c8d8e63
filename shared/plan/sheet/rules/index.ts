import { type Rule } from '../rule';
import { checksShould, checksVerdict } from './checks-verdict';
import { dimsLooseFigure } from './dims-loose-figure';
import { dimsKind } from './dims-kind';
import { dimsLoop } from './dims-loop';
import { dimsUnknown } from './dims-unknown';
import { dimsUnlikely } from './dims-unlikely';
import { dimsUntaken } from './dims-untaken';
import { dimsUnused } from './dims-unused';
import { fastenersBite } from './fasteners-bite';
import { fastenersInCut } from './fasteners-in-cut';
import { fastenersPilot } from './fasteners-pilot';
import { fastenersThrough } from './fasteners-through';
import { guardsExit } from './guards-exit';
import { guardsOpen } from './guards-open';
import { guardsPower } from './guards-power';
import { layoutEnough } from './layout-enough';
import { linksDisclosure } from './links-disclosure';
import { machineRegion } from './machine-region';
import { mediaAlt } from './media-alt';
import { mediaCaptions } from './media-captions';
import { mediaSaysOtherwise } from './media-says-otherwise';
import { mediaStretch } from './media-stretch';
import { movementSeason } from './movement-season';
import { partsFitsStock } from './parts-fits-stock';
import { partsMade } from './parts-made';
import { partsQuantity } from './parts-quantity';
import { partsThickness } from './parts-thickness';
import { partsUsed } from './parts-used';
import { planOrder } from './plan-order';
import { planReferences } from './plan-references';
import { planSteps } from './plan-steps';
import { safetyCoast } from './safety-coast';
import { safetyConfined } from './safety-confined';
import { safetyFinish } from './safety-finish';
import { safetyLengthStop } from './safety-length-stop';
import { safetyEyeEarDust } from './safety-eye-ear-dust';
import { safetyLooseClothing } from './safety-loose-clothing';
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
  planReferences,
  planOrder,
  dimsUnknown,
  dimsLoop,
  dimsKind,
  dimsUntaken,
  dimsUnlikely,
  dimsLooseFigure,
  dimsUnused,
  checksVerdict,
  checksShould,
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
  mediaSaysOtherwise,
  mediaStretch,
  mediaAlt,
  mediaCaptions,
  linksDisclosure,
  textEmpty,
  textLong,
];
