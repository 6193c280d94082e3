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
