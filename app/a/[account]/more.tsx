export { MoreScreen as default } from '../../../src/features/shell/more-screen';
