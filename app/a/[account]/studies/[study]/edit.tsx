export { EditStudyScreen as default } from '../../../../../src/features/workbench/lazy-screens';
