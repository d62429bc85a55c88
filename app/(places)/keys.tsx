export { KeysScreen as default } from '../../components/keys/keys-screen';
