export { CurvesScreen as default } from '../../components/curves/curves-screen';
export { RouteError as ErrorBoundary } from '../../components/shell/route-error';
