export { PacksScreen as default } from '../../../../src/features/packs/packs-screen';
