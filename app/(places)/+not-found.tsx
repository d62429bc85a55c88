export { NotFound as default } from '../../components/shell/not-found';
export { RouteError as ErrorBoundary } from '../../components/shell/route-error';
