export { DeskLayout as default } from '../../components/desk/desk-later';
