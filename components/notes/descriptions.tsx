import { Section } from '../shell/prose';
import { TextLink } from '../ui/text-link';
import { Words } from '../ui/words';

/** Where the contract is written down. */
export function Descriptions() {
  return (
    <Section heading="The contract">
      <Words>
        <TextLink href="/docs">Read and try every operation</TextLink>, or feed{' '}
        <TextLink href="/openapi.json">the OpenAPI document</TextLink> to your generator. Errors are
        problem documents after RFC 9457: each names the field and what to write instead.
      </Words>
    </Section>
  );
}
