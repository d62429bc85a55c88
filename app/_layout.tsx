export { Root as default } from '../components/shell/root';
