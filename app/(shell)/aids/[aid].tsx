export { AidScreen as default } from '../../../components/aids/aid-screen';
