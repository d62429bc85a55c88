export {
  PlacesLayout as default,
  placesSettings as unstable_settings,
} from '../../components/shell/places-layout';
