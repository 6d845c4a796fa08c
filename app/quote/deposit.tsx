export { DepositScreen as default } from '../../components/price/deposit-screen';
