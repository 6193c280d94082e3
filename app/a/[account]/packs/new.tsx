export { NewPackScreen as default } from '../../../../src/features/packs/pack-screen';
