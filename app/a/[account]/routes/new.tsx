export { NewRouteScreen as default } from '../../../../src/features/workbench/lazy-screens';
