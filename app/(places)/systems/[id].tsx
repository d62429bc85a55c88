export { SystemScreen as default } from '../../../components/systems/system-screen';
