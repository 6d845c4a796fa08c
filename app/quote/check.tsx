export { CheckScreen as default } from '../../components/price/check-screen';
