export { FoodScreen as default } from '../../../../src/features/workbench/lazy-screens';
