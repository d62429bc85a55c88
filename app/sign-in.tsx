export { SignInScreen as default } from '../components/account/sign-in-screen';
export { RouteError as ErrorBoundary } from '../components/shell/route-error';
