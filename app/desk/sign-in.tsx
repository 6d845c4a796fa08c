export { SignInScreen as default } from '../../components/desk/desk-later';
