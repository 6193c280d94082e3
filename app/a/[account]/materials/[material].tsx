export { MaterialScreen as default } from '../../../../src/features/materials/material-screen';
