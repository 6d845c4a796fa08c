export { TermsScreen as default } from '../components/legal/terms-screen';
