export { AidsScreen as default } from '../../../components/aids/aids-screen';
