export { NotFoundPage as default } from '../src/features/shell/not-found-page';
