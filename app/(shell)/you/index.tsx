export { YouScreen as default } from '../../../components/account/you-screen';
