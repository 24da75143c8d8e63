import { bladeSpeedScreen } from './blade-speed/blade-speed';
import { boardFeetScreen } from './board-feet/board-feet';
import { dressedSizeScreen } from './dressed-size/dressed-size';
import { glueWaitScreen } from './glue-wait/glue-wait';
import { moistureScreen } from './moisture/moisture';
import { noiseDoseScreen } from './noise-dose/noise-dose';
import { panelGapScreen } from './panel-gap/panel-gap';
import { riseAndRunScreen } from './rise-and-run/rise-and-run';
import { sawDepthScreen } from './saw-depth/saw-depth';
import { type AnyScreen } from './screen';
import { screwHolesScreen } from './screw-holes/screw-holes';
import { screwLengthScreen } from './screw-length/screw-length';
import { sheetThicknessScreen } from './sheet-thickness/sheet-thickness';
import { withdrawalScreen } from './withdrawal/withdrawal';
import { woodMovementScreen } from './wood-movement/wood-movement';
import { woodWeightScreen } from './wood-weight/wood-weight';

/** The screen of every aid, in the order they are listed. */
export const screens: readonly AnyScreen[] = [
  moistureScreen,
  woodMovementScreen,
  panelGapScreen,
  screwHolesScreen,
  screwLengthScreen,
  withdrawalScreen,
  boardFeetScreen,
  dressedSizeScreen,
  sheetThicknessScreen,
  woodWeightScreen,
  sawDepthScreen,
  bladeSpeedScreen,
  riseAndRunScreen,
  noiseDoseScreen,
  glueWaitScreen,
];
