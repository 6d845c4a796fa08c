export { StartScreen as default } from '../../components/wizard/start-screen';
