export { PackScreen as default } from '../../../../src/features/workbench/lazy-screens';
