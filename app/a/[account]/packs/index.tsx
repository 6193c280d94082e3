export { PacksScreen as default } from '../../../../src/features/workbench/lazy-screens';
