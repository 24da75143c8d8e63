export { SignUpScreen as default } from '../../components/account/sign-up-screen';
