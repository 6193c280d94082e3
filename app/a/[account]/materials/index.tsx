export { MaterialsScreen as default } from '../../../../src/features/materials/materials-screen';
