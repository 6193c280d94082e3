export { WallsScreen as default } from '../../../../src/features/walls/walls-screen';
