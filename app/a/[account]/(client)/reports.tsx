export { ReportsScreen as default } from '../../../../src/features/landing/reports-screen';
