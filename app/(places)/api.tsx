export { ApiScreen as default } from '../../components/notes/api-screen';
export { RouteError as ErrorBoundary } from '../../components/shell/route-error';
