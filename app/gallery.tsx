export { GalleryScreen as default } from '../src/features/gallery/gallery-screen';
