export { RoutesScreen as default } from '../../../../src/features/routes/routes-screen';
