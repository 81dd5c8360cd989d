export type AuditVerdict = { verdict: 'passed' | 'failed' | 'not run'; lines: string[] };

type Vulnerability = { name: string; severity: string; range?: string };

/** What `npm audit --json` found. Whatever is no report of an audit, such as a registry that refuses, is no audit. */
export function readAudit(output: string): AuditVerdict {
  const report = jsonOf(output);
  if (!isReport(report)) {
    const why = isRecord(report) && typeof report.message === 'string' ? report.message : 'the registry did not answer';
    return { verdict: 'not run', lines: [why] };
  }
  const found = Object.values(report.vulnerabilities);
  const lines = found.map(({ name, severity, range }) => `${severity}: ${name} ${range ?? ''}`.trim());
  return { verdict: found.length === 0 ? 'passed' : 'failed', lines };
}

type Report = { vulnerabilities: Record<string, Vulnerability>; metadata: { dependencies: { prod: number } } };

/** A report says over how many packages it was made: one over none has looked at nothing. */
function isReport(value: unknown): value is Report {
  if (!isRecord(value) || !isRecord(value.vulnerabilities) || !isRecord(value.metadata)) return false;
  const { dependencies } = value.metadata;
  return isRecord(dependencies) && typeof dependencies.prod === 'number' && dependencies.prod > 0;
}

function isRecord(value: unknown): value is Record<string, unknown> {
  return typeof value === 'object' && value !== null;
}

function jsonOf(text: string): unknown {
  try {
    return JSON.parse(text);
  } catch {
    return undefined;
  }
}
