export { NewWallScreen as default } from '../../../../src/features/walls/wall-screen';
