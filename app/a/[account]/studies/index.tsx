export { StudiesListScreen as default } from '../../../../src/features/workbench/lazy-screens';
