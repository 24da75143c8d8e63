export { PeopleScreen as default } from '../../../components/account/people-screen';
