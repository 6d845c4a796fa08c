export { BookScreen as default } from '../../components/price/book-screen';
