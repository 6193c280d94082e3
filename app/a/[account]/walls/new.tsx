export { NewWallScreen as default } from '../../../../src/features/workbench/lazy-screens';
