export { NotFoundScreen as default } from '../components/shell/not-found-screen';
