export { SignInScreen as default } from '../../components/account/sign-in-screen';
