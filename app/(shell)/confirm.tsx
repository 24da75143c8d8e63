export { ConfirmScreen as default } from '../../components/account/confirm-screen';
