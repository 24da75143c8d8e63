export { GalleryScreen as default } from '../components/ui/gallery/gallery-screen';
