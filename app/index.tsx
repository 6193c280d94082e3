export { HomeRedirect as default } from '../src/features/shell/home-redirect';
