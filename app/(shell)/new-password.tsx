export { NewPasswordScreen as default } from '../../components/account/new-password-screen';
