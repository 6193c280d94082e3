export { NewStudyScreen as default } from '../../../../src/features/studies/study-form-screen';
