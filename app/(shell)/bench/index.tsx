export { BenchScreen as default } from '../../../components/bench/bench-screen';
