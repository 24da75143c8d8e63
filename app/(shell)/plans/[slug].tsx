export { PlanScreen as default } from '../../../components/plans/plan-screen';
