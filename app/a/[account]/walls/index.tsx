export { WallsScreen as default } from '../../../../src/features/workbench/lazy-screens';
