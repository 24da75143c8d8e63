export { CopyScreen as default } from '../../../components/bench/copy-screen';
