export { GalleryScreen as default } from '../src/features/workbench/lazy-screens';
