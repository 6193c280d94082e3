export { AccountRedirect as default } from '../../../src/features/workbench/lazy-screens';
