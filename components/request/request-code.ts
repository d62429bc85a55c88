import { jsonText } from './json-text';

/** A POST to the API, to be written down in some language. */
export interface WrittenRequest {
  readonly url: string;
  readonly body: object;
  /** What the answer is called: a word that every language takes as a variable. */
  readonly result: string;
}

const inSingleQuotes = {
  shell: (text: string) => `'${text.replaceAll("'", "'\\''")}'`,
  r: (text: string) => `'${text.replaceAll('\\', '\\\\').replaceAll("'", "\\'")}'`,
};

const curl = ({ url, body }: WrittenRequest) => `curl ${url} \\
  -H "Authorization: Bearer $STEPWELL_KEY" \\
  -H "Content-Type: application/json" \\
  -d ${inSingleQuotes.shell(jsonText(body))}`;

const python = ({ url, body, result }: WrittenRequest) => `import json
import os
import urllib.request

request = urllib.request.Request(
    "${url}",
    data=json.dumps(${jsonText(body, '    ')}).encode(),
    headers={
        "Authorization": "Bearer " + os.environ["STEPWELL_KEY"],
        "Content-Type": "application/json",
    },
)
with urllib.request.urlopen(request) as response:
    ${result} = json.load(response)`;

const typescript = ({
  url,
  body,
  result,
}: WrittenRequest) => `const response = await fetch("${url}", {
  method: "POST",
  headers: {
    Authorization: \`Bearer \${process.env.STEPWELL_KEY}\`,
    "Content-Type": "application/json",
  },
  body: JSON.stringify(${jsonText(body, '  ')}),
});
if (!response.ok) throw new Error(await response.text());
const ${result} = await response.json();`;

const r = ({ url, body, result }: WrittenRequest) => `library(httr2)

${result} <- request("${url}") |>
  req_auth_bearer_token(Sys.getenv("STEPWELL_KEY")) |>
  req_body_raw(${inSingleQuotes.r(jsonText(body))}, type = "application/json") |>
  req_perform() |>
  resp_body_json()`;

/** How a request is written in each language. The key stays in a variable of the environment. */
export const requestCode = { curl, Python: python, TypeScript: typescript, R: r } as const;
export type Language = keyof typeof requestCode;
export const languages = Object.keys(requestCode) as readonly Language[];
