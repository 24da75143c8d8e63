export { SessionsScreen as default } from '../../../components/account/sessions-screen';
