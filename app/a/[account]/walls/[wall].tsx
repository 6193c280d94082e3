export { WallScreen as default } from '../../../../src/features/workbench/lazy-screens';
