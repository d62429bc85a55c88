export { NotesScreen as default } from '../../components/notes/notes-screen';
export { RouteError as ErrorBoundary } from '../../components/shell/route-error';
