export { PackScreen as default } from '../../../../src/features/packs/pack-screen';
