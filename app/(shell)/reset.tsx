export { ResetScreen as default } from '../../components/account/reset-screen';
