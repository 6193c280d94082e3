export { ResetPasswordScreen as default } from '../../src/features/sign-in/reset-password-screen';
