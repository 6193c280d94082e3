export { NewFoodScreen as default } from '../../../../src/features/foods/food-screen';
