/** The demo's sign-ins as a small table: role, name of the workshop or person when given, e-mail, password. */
export function signInLines(signIns) {
  const cells = signIns.map(({ role, workshop = '', email, password }) => [role, email, password, workshop]);
  const widths = [0, 1, 2].map((column) => Math.max(...cells.map((row) => row[column].length)));
  const line = (row) =>
    row
      .map((cell, column) => cell.padEnd(widths[column] ?? 0))
      .join('  ')
      .trimEnd();
  return ['Sign in as:', ...cells.map((row) => `  ${line(row)}`)];
}
