export { RouteScreen as default } from '../../../../src/features/workbench/lazy-screens';
