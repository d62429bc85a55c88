export { MixtureScreen as default } from '../../components/mixture/mixture-screen';
