export { MyLinkScreen as default } from '../../components/my/my-link-screen';
