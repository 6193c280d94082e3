export { NewMaterialScreen as default } from '../../../../src/features/materials/material-screen';
