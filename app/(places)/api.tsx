export { ApiScreen as default } from '../../components/notes/api-screen';
