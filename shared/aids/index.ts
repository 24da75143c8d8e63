import { type AnyAid } from './aid';
import { taperAid } from './taper/taper';
import { squarenessAid } from './squareness/squareness';
import { runnerAid } from './runner/runner';
import { mitreAid } from './mitre/mitre';
import { equalSpacingAid } from './equal-spacing/equal-spacing';
import { arcAid } from './arc/arc';
import { bladeSpeedAid } from './blade-speed/blade-speed';
import { boardFeetAid } from './board-feet/board-feet';
import { dressedSizeAid } from './dressed-size/dressed-size';
import { fiveCutAid } from './five-cut/five-cut';
import { glueWaitAid } from './glue-wait/glue-wait';
import { moistureAid } from './moisture/moisture';
import { noiseDoseAid } from './noise-dose/noise-dose';
import { panelGapAid } from './panel-gap/panel-gap';
import { repeatedCutsAid } from './repeated-cuts/repeated-cuts';
import { riseAndRunAid } from './rise-and-run/rise-and-run';
import { sawDepthAid } from './saw-depth/saw-depth';
import { screwHolesAid } from './screw-holes/screw-holes';
import { screwLengthAid } from './screw-length/screw-length';
import { sheetThicknessAid } from './sheet-thickness/sheet-thickness';
import { shimStackAid } from './shim-stack/shim-stack';
import { withdrawalAid } from './withdrawal/withdrawal';
import { woodMovementAid } from './wood-movement/wood-movement';
import { woodWeightAid } from './wood-weight/wood-weight';

/** Every aid, in the order the Bench lists them. Adding one: its folder here, its folder in components/aids, and a line in each list. */
export const aids: readonly AnyAid[] = [
  fiveCutAid,
  shimStackAid,
  runnerAid,
  repeatedCutsAid,
  squarenessAid,
  equalSpacingAid,
  arcAid,
  mitreAid,
  taperAid,
  moistureAid,
  woodMovementAid,
  panelGapAid,
  screwHolesAid,
  screwLengthAid,
  withdrawalAid,
  boardFeetAid,
  dressedSizeAid,
  sheetThicknessAid,
  woodWeightAid,
  sawDepthAid,
  bladeSpeedAid,
  riseAndRunAid,
  noiseDoseAid,
  glueWaitAid,
];

/** The aid of a name. */
export const aidOf = (id: string): AnyAid | undefined => aids.find((aid) => aid.id === id);
