import { Link } from 'expo-router';
import { StyleSheet, View } from 'react-native';
import { space } from '../ui/theme';
import { Words } from '../ui/words';
import { Page } from './page';
import { Prose } from './prose';
import { usePlaces } from './use-places';

/** An address that leads nowhere. */
export function NotFound() {
  const places = usePlaces();
  return (
    <Page title="No page at this address">
      <Prose>
        <View style={styles.places}>
          <Words>The address may be mistyped, or the page has moved. These are the places:</Words>
          {places.map((place) => (
            <Link key={place.href} href={place.href} style={styles.place}>
              <Words kind="button" tone="well">
                {place.label}
              </Words>
              <Words>{` ${place.question}`}</Words>
            </Link>
          ))}
        </View>
      </Prose>
    </Page>
  );
}

const styles = StyleSheet.create({
  places: { gap: space[2] },
  place: { paddingVertical: space[2] },
});
