export { LeadScreen as default } from '../../../components/desk/lead-screen';
