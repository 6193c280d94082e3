export { RequestsScreen as default } from '../../../../src/features/workbench/lazy-screens';
