export { PriceScreen as default } from '../../components/price/price-screen';
