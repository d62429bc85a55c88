export { SystemsLayout as default } from '../../../components/systems/systems-layout';
