export { AccountScreen as default } from '../../../src/features/workbench/lazy-screens';
