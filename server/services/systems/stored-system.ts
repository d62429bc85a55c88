import type { Constant } from '../../../shared/constant';
import type { Determination, StoredSystem, SystemSummary } from '../../../shared/stored-system';
import type { SystemConstant } from '../../database/entities/system-constant';
import type { SystemRevision } from '../../database/entities/system-revision';

const constantOf = (row: SystemConstant): Constant => ({
  step: row.step,
  value: row.value,
  kind: row.kind,
  temperature: row.temperature,
  ionicStrength: row.ionicStrength,
  uncertainty: row.uncertainty,
  deltaH: row.deltaH,
  deltaCp: row.deltaCp,
  approximate: row.approximate,
  estimate: row.estimate,
  source: row.source,
  provenance: row.provenance,
  provenanceNote: row.provenanceNote,
});

/** The rows are in order of determination and step. */
function determinationsOf(rows: readonly SystemConstant[]): Determination[] {
  const numbers = [...new Set(rows.map(({ determination }) => determination))];
  return numbers.map((number, index) => {
    const these = rows.filter(({ determination }) => determination === number);
    return {
      preferred: index === 0,
      listedAs: these[0]?.listedAs ?? null,
      constants: these.map(constantOf),
    };
  });
}

/** The preferred constants: those that a call by id computes with. */
export const preferredConstants = ({
  determinations: [first],
}: Pick<StoredSystem, 'determinations'>): readonly Constant[] => first?.constants ?? [];

/** A stored revision, its system and its constants in order beside it, as the contract has it. */
export function storedSystemOf(row: SystemRevision): StoredSystem {
  const determinations = determinationsOf(row.constants ?? []);
  return {
    id: row.systemId,
    revision: row.revision,
    origin: row.system?.organizationId == null ? 'handbook' : 'organization',
    name: row.name,
    aliases: row.aliases,
    formula: row.formula,
    cas: row.cas,
    note: row.note,
    fullyProtonatedCharge: row.fullyProtonatedCharge,
    pKa: preferredConstants({ determinations }).map(({ value }) => value),
    species: row.species.map((formula, index) => ({
      index,
      charge: row.fullyProtonatedCharge - index,
      protonsLost: index,
      formula,
    })),
    determinations,
  };
}

/** A system in a list. */
export const summaryOf = (system: StoredSystem): SystemSummary => ({
  id: system.id,
  revision: system.revision,
  origin: system.origin,
  name: system.name,
  aliases: system.aliases,
  formula: system.formula,
  cas: system.cas,
  fullyProtonatedCharge: system.fullyProtonatedCharge,
  pKa: system.pKa,
});
