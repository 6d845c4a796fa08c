export { LeadsScreen as default } from '../../../components/desk/leads-screen';
