export { FoodScreen as default } from '../../../../src/features/foods/food-screen';
