import {
  BestAreaFit,
  BestLongSideFit,
  BestShortSideFit,
  BottomLeft,
  pack2D,
} from 'binpackingjs/2d';
import { MaxRectsPacker } from 'maxrects-packer';
import { type Job, type Rect } from '../../shared/layout';

type Pack = (job: Job) => Rect[][];

interface Box {
  width: number;
  height: number;
  rotatable: boolean;
}

/** Parts a kerf larger on sheets a kerf larger: the packers know no kerf between parts alone. */
function boxesOf(job: Job): Box[] {
  return job.items.flatMap(({ w, h, qty, rotatable }) =>
    Array.from({ length: qty }, () => ({ width: w + job.kerf, height: h + job.kerf, rotatable })),
  );
}

function roomOf(job: Job): { width: number; height: number } {
  const { w = 0, h = 0, trims } = job.sheets[0] ?? {};
  const { left = 0, right = 0, bottom = 0, top = 0 } = trims ?? {};
  return { width: w - left - right + job.kerf, height: h - bottom - top + job.kerf };
}

const byMaxRects =
  (logic: 0 | 1 | 2): Pack =>
  (job) => {
    const { width, height } = roomOf(job);
    const settings = { smart: false, pot: false, square: false, allowRotation: true, logic };
    const packer = new MaxRectsPacker(width, height, 0, settings);
    packer.addArray(
      boxesOf(job).map((box) => ({ ...box, x: 0, y: 0, allowRotation: box.rotatable })) as never[],
    );
    return packer.bins.map((bin) =>
      bin.rects.map(({ x, y, width: w, height: h }) => ({ x, y, w, h })),
    );
  };

const byPack2D =
  (heuristic: () => BestAreaFit | BestLongSideFit | BestShortSideFit | BottomLeft): Pack =>
  (job) => {
    const room = roomOf(job);
    const boxes = boxesOf(job)
      .sort((a, b) => b.width * b.height - a.width * a.height)
      .map(({ width, height, rotatable }) => ({ width, height, constrainRotation: !rotatable }));
    const bins = boxes.map(() => room);
    const { packedBins } = pack2D({ bins, boxes, heuristic: heuristic() });
    return packedBins
      .filter((bin) => bin.boxes.length > 0)
      .map((bin) => bin.boxes.map(({ x, y, width, height }) => ({ x, y, w: width, h: height })));
  };

/** General-purpose packers from npm, each with every rule it has. */
export const packers: Record<string, Pack> = {
  'maxrects-packer, area': byMaxRects(0),
  'maxrects-packer, edge': byMaxRects(1),
  'binpackingjs, short side': byPack2D(() => new BestShortSideFit()),
  'binpackingjs, long side': byPack2D(() => new BestLongSideFit()),
  'binpackingjs, area': byPack2D(() => new BestAreaFit()),
  'binpackingjs, bottom left': byPack2D(() => new BottomLeft()),
};

/** Can the parts be cut apart edge to edge? */
export function sawable(parts: readonly Rect[]): boolean {
  if (parts.length < 2) return true;
  for (const axis of ['x', 'y'] as const) {
    const size = axis === 'x' ? 'w' : 'h';
    const sorted = [...parts].sort((a, b) => a[axis] - b[axis]);
    let reach = -Infinity;
    for (let i = 0; i < sorted.length; i++) {
      const part = sorted[i]!;
      if (i > 0 && part[axis] >= reach)
        return sawable(sorted.slice(0, i)) && sawable(sorted.slice(i));
      reach = Math.max(reach, part[axis] + part[size]);
    }
  }
  return false;
}
