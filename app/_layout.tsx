export { RootLayout as default } from '../components/root-layout';
