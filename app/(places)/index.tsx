export { CurvesScreen as default } from '../../components/curves/curves-screen';
