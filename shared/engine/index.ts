export { ENGINE_VERSION } from './version';
export { InputError } from './description/input-error';
export * from './description/ranges';
export type * from './description/storage-description';
export type * from './description/evaluation';
export { saturationPressurePa } from './water-vapour';
export { layerAt, type GasAtConditions, type LayerAtConditions } from './layer-at';
export { wallState, type WallConditions } from './wall-state';
export { wallInTest } from './wall-in-test';
export { standardTests } from './standard-tests';
export { rateToPermeance, type TransmissionRate, type PermeanceFromRate } from './rate-to-permeance';
export { gasFromStated, type StatedGas } from './gas-from-stated';
export { packConductance, type PackConductance, type PackConditions } from './pack-conductance';
export { pouchArea, type PouchDescription, type PouchArea } from './pouch';
export {
  pinhole,
  type PinholeDescription,
  type PinholeAnswer,
  type CoverDescription,
} from './pinhole-answer';
export { isothermMoisture, isothermActivity } from './isotherm-answer';
export { storage } from './storage-answer';
export { evaluate } from './evaluate';
export { timeLag, type TimeLagDescription, type TimeLagLayer, type TimeLagAnswer } from './time-lag';
export { transient, type TransientDescription, type TransientAnswer } from './transient';
export { equalProgress, type EqualProgressDescription } from './equal-progress';
export { light, type LightLayer, type Transmission } from './light';
export { elasticities, type ElasticityRequest, type ElasticityAnswer } from './elasticity';
export { type InputName } from './variable-system';
export {
  largestPermeance,
  requiredThickness,
  type LargestPermeanceRequest,
  type LargestPermeanceAnswer,
  type RequiredThicknessRequest,
  type RequiredThicknessAnswer,
} from './solve-for-target';
export { type UncertaintyDescription, type UncertainInput } from './uncertainty';
export {
  drawColumns,
  sampleDraws,
  summariseDraws,
  type DrawColumn,
  type DrawRange,
  type DrawSummary,
  type DrawQuantile,
} from './monte-carlo';
export { packMakeUp, pouchCutArea, type MakeUpLayer, type MakeUpWall, type PackMakeUp } from './make-up';
