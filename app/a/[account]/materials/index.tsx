export { MaterialsScreen as default } from '../../../../src/features/workbench/lazy-screens';
