export { WallScreen as default } from '../../../../src/features/walls/wall-screen';
