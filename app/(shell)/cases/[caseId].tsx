export { CaseScreen as default } from '../../../components/cases/case-screen';
