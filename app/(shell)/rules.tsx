export { RulesScreen as default } from '../../components/account/notices-screens';
