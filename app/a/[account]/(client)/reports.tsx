export { ReportsScreen as default } from '../../../../src/features/workbench/lazy-screens';
