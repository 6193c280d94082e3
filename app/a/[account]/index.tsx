export { AccountRedirect as default } from '../../../src/features/shell/account-redirect';
