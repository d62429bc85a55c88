/** A variable that the test command sets. Throws where a test is run without that command. */
export function given(name: string): string {
  const value = process.env[name];
  if (!value) throw new Error(`${name} is not set: run the tests by \`npm test\`.`);
  return value;
}
