export { RouteScreen as default } from '../../../../src/features/routes/route-screen';
