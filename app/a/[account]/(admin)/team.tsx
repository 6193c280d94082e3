export { TeamScreen as default } from '../../../../src/features/landing/team-screen';
