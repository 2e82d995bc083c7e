/** A sheet or blueprint that cannot be published; names the file and every offending line. */
export class SheetInvalid extends Error {
  readonly path: string;
  readonly issues: { line: number; message: string }[];

  constructor(path: string, issues: { line: number; message: string }[]) {
    super(issues.map((issue) => `${path}:${issue.line}: ${issue.message}`).join('\n'));
    this.name = 'SheetInvalid';
    this.path = path;
    this.issues = issues;
  }
}
