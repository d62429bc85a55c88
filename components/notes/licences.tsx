import { Section } from '../shell/prose';
import { TextLink } from '../ui/text-link';
import { Words } from '../ui/words';

/** Typefaces that ship with the app. */
export function Licences() {
  return (
    <Section heading="Typefaces">
      <Words>
        Words are set in Hanken Grotesk (
        <TextLink href="/fonts/hanken-grotesk-licence.txt">its licence</TextLink>), numbers and
        formulas in JetBrains Mono (
        <TextLink href="/fonts/jetbrains-mono-licence.txt">its licence</TextLink>). Both are under
        the SIL Open Font License 1.1.
      </Words>
    </Section>
  );
}
