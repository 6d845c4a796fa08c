export { MyScreen as default } from '../../components/my/my-screen';
