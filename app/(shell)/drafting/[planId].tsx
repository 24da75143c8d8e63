export { DraftScreen as default } from '../../../components/drafting/draft-screen';
