export { TeamScreen as default } from '../../../../src/features/workbench/lazy-screens';
