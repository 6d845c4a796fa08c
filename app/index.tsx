export { LandingScreen as default } from '../components/landing/landing-screen';
