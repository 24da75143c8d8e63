export { TermsScreen as default } from '../../components/account/notices-screens';
