export { StudyScreen as default } from '../../../../../src/features/studies/study-screen';
