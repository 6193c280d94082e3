export { RoutesScreen as default } from '../../../../src/features/workbench/lazy-screens';
