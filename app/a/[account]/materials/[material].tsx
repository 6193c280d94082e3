export { MaterialScreen as default } from '../../../../src/features/workbench/lazy-screens';
