import { buildPlan, type BuiltPlan } from './build-plan';
import { outfeedCart } from './outfeed-cart.data';
import { shootingBoard } from './shooting-board.data';
import { toolCabinet } from './tool-cabinet.data';
import { trammelTalk } from './trammel.data';

export const demoPlans = [
  { key: 'shooting-board', maker: 'odalys', rows: shootingBoard },
  { key: 'outfeed-cart', maker: 'odalys', rows: outfeedCart },
  { key: 'wall-tool-cabinet', maker: 'corbin', rows: toolCabinet },
] as const;

export const builtDemoPlans = (): { key: string; maker: 'odalys' | 'corbin'; built: BuiltPlan }[] =>
  demoPlans.map(({ key, maker, rows }) => ({ key, maker, built: buildPlan(rows) }));

/** What the film script draws: a slide for each stretch. */
export function demoFilms(): { key: string; slides: { title: string; seconds: number }[] }[] {
  return [
    ...demoPlans.map(({ key, rows }) => ({
      key: key,
      slides: rows.steps.map((s) => ({ title: s.title, seconds: s.seconds })),
    })),
    {
      key: 'trammel',
      slides: trammelTalk.map((s) => ({
        title: s.says.split(' ').slice(0, 6).join(' '),
        seconds: s.seconds,
      })),
    },
  ];
}
