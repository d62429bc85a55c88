import type { TextInput, View } from 'react-native';

/** The DOM element behind a view: react-native-web's refs are the elements themselves. */
export const elementOf = (view: View | TextInput | null) => view as unknown as HTMLElement | null;
