export { VisitScreen as default } from '../../components/price/visit-screen';
