export { StudiesListScreen as default } from '../../../../src/features/studies/studies-list-screen';
