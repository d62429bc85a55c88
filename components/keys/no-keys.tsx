import type { AccountAnswer } from '../../shared/account';
import { Prose, Section } from '../shell/prose';
import { Words } from '../ui/words';

/** Why there are no keys for this person, and whom to ask. */
export function NoKeys({ who: { role, organization } }: { readonly who: AccountAnswer }) {
  return (
    <Prose>
      <Section heading={`As ${role} you need no key`}>
        <Words>
          {`A key lets a program call Stepwell for ${organization.name}. Developers and admins keep ` +
            'them; everything you do here on screen works without one.'}
        </Words>
      </Section>
      <Section heading="If a program should call for you">
        <Words>
          {`Ask an admin of ${organization.name}. They can issue a key for the program, or make you ` +
            'a developer; then your keys are kept on this page. Tell them what the program is ' +
            'called, what it computes, and until when.'}
        </Words>
      </Section>
    </Prose>
  );
}
