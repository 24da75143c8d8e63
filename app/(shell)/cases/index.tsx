export { CasesScreen as default } from '../../../components/cases/cases-screen';
