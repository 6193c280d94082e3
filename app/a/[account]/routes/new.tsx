export { NewRouteScreen as default } from '../../../../src/features/routes/route-screen';
