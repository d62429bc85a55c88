export { NotFound as default } from '../../components/shell/not-found';
