export { MoreScreen as default } from '../../../src/features/workbench/lazy-screens';
