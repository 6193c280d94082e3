export { NewPackScreen as default } from '../../../../src/features/workbench/lazy-screens';
