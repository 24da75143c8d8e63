export { DraftingScreen as default } from '../../../components/drafting/drafting-screen';
