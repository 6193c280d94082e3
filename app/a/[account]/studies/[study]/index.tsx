export { StudyScreen as default } from '../../../../../src/features/workbench/lazy-screens';
