export { PlansScreen as default } from '../../components/plans/plans-screen';
