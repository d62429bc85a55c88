import * as Clipboard from 'expo-clipboard';
import { useToast } from './toast';

/** Puts text on the clipboard and says so, or says that the browser refused. */
export function useCopy() {
  const say = useToast();
  return (what: string, text: string) =>
    void Clipboard.setStringAsync(text).then(
      (done) => say({ text: done ? `${what} copied` : refused }),
      () => say({ text: refused }),
    );
}

const refused = 'This browser let nothing be copied. Select the text and copy it.';
