export { PlacesLayout as default } from '../../components/shell/places-layout';
