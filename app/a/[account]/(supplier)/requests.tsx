export { RequestsScreen as default } from '../../../../src/features/landing/requests-screen';
