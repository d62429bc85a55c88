import { Section } from '../shell/prose';
import { Words } from '../ui/words';

/** What a prediction does not replace. */
export function Cautions() {
  return (
    <Section heading="At the bench">
      <Words>A predicted pH is an estimate: calibrate the meter, measure, adjust.</Words>
      <Words>
        Concentrated acid goes into water, slowly, with eye protection and gloves; volatile acids
        and ammonia under the fume hood. Never mix waste. Follow your chemical-hygiene plan and the
        safety data sheets.
      </Words>
      <Words>
        Nothing here is for a medicine, an infusion or food without a licensed person’s review.
      </Words>
    </Section>
  );
}
