export { DeskHome as default } from '../../components/desk/desk-home';
