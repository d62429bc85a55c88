export { SystemsScreen as default } from '../../../components/systems/systems-screen';
