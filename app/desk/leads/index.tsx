export { LeadsScreen as default } from '../../../components/desk/desk-later';
