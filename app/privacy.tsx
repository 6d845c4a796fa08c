export { PrivacyScreen as default } from '../components/legal/privacy-screen';
