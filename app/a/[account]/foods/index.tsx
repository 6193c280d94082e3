export { FoodsScreen as default } from '../../../../src/features/workbench/lazy-screens';
