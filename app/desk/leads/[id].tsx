export { LeadScreen as default } from '../../../components/desk/desk-later';
