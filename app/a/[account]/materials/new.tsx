export { NewMaterialScreen as default } from '../../../../src/features/workbench/lazy-screens';
