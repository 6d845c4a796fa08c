export { SignInScreen as default } from '../../components/desk/sign-in-screen';
