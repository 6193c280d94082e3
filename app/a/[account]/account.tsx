export { AccountScreen as default } from '../../../src/features/account/account-screen';
