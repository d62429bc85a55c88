export { NotesScreen as default } from '../../components/notes/notes-screen';
