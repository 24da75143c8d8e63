export { SafetyScreen as default } from '../../components/account/notices-screens';
