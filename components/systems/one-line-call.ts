/** The fractions of a stored system at one pH, as a line for a shell; the key stays in a variable. */
export const oneLineCall = (origin: string, id: string) =>
  `curl "${origin}/v1/systems/${id}/fractions?pH=7.4" \\\n  -H "Authorization: Bearer $STEPWELL_KEY"`;
