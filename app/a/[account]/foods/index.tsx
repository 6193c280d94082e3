export { FoodsScreen as default } from '../../../../src/features/foods/foods-screen';
