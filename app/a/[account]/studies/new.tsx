export { NewStudyScreen as default } from '../../../../src/features/workbench/lazy-screens';
