export { NewFoodScreen as default } from '../../../../src/features/workbench/lazy-screens';
