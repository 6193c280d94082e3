export { ForgottenPasswordScreen as default } from '../../src/features/sign-in/forgotten-password-screen';
