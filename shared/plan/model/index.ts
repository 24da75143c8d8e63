/**
 * The measured model: what a plan means. `createModel(document, readings?)` works out dimensions, checks and
 * parts; `model.update(document, readings?)` works out only what changed. `judgeReading` judges a figure by a
 * dimension's sense. `describeCheck`, `describeReading`, `formatParts` say it in the person's units.
 * Figures are base units: mm, degrees, minutes, kilograms. Pure.
 */
export { createModel, type PlanModel, type PlanModel as Model } from './model';
export { compileModel, type CompiledModel } from './compiled';
export { judgeReading, type ReadingJudgement, type ReadingVerdict } from './judge';
export {
  describeCheck,
  describeCoarse,
  describeReading,
  figureOf,
  formatParts,
  verdictWord,
} from './words';
export { fitWord } from './check';
export * from './types';
