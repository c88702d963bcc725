import type { Contract } from '@embertally/shared/contracts/contract';
import { policyInWords } from './describe-api.ts';

const escaped = (text: string): string => text.replace(/[&<>"']/g, (sign) => `&#${sign.charCodeAt(0)};`);

/** The API as a plain page: every operation, what it does and who may ask for it. */
export function describeInWords(contracts: readonly Contract[]): string {
  const rows = [...contracts]
    .sort((a, b) => a.path.localeCompare(b.path) || a.method.localeCompare(b.method))
    .map(
      (contract) =>
        `<tr><th scope="row"><code>${contract.method} ${escaped(contract.path)}</code></th><td>${escaped(contract.summary)}</td><td>${escaped(policyInWords(contract.policy))}</td></tr>`,
    );
  return `<!doctype html>
<html lang="en">
<head><meta charset="utf-8"><meta name="viewport" content="width=device-width"><title>Embertally: the API</title></head>
<body>
<main>
<h1>Embertally: the API</h1>
<p>Every answer that is not 2xx is <code>application/problem+json</code>. Schemas are in <a href="/api/openapi.json">openapi.json</a>.</p>
<table>
<caption>Operations</caption>
<thead><tr><th scope="col">Operation</th><th scope="col">What it does</th><th scope="col">For whom</th></tr></thead>
<tbody>
${rows.join('\n')}
</tbody>
</table>
</main>
</body>
</html>
`;
}
