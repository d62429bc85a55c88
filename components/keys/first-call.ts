/**
 * A call that works as it is copied into a shell: the forms of phosphate at pH 7.4.
 * @param key the key itself, or a shell variable that holds it, such as `$STEPWELL_KEY`
 */
export const firstCall = (origin: string, key: string) => `curl ${origin}/v1/fractions \\
  -H "Authorization: Bearer ${key}" \\
  -H "Content-Type: application/json" \\
  -d '{
    "system": {
      "name": "phosphoric acid",
      "fullyProtonatedCharge": 0,
      "pKa": ["2.148", "7.198", "12.35"]
    },
    "pH": "7.4",
    "digits": 12
  }'`;
