import { parseArgs } from 'node:util';
import { Trouble } from '../process/trouble.mjs';

const USAGE = `Usage: npm run import-log -- --chain ID FILE… [--url http://127.0.0.1:4190] [--email … --password …]
The sign-in may also come from HALFPITCH_EMAIL and HALFPITCH_PASSWORD; without any, the demo's owner signs in.`;

/** What was asked for: { chain, files, url, email, password }. */
export function readOptions(args, env) {
  try {
    const { values, positionals } = parseArgs({
      args,
      allowPositionals: true,
      options: {
        chain: { type: 'string' },
        url: { type: 'string' },
        email: { type: 'string' },
        password: { type: 'string' },
      },
    });
    if (!values.chain || positionals.length === 0) throw new Trouble(USAGE);
    return {
      chain: values.chain,
      files: positionals,
      url: values.url ?? `http://127.0.0.1:${env.PORT ?? 4190}`,
      email: values.email ?? env.HALFPITCH_EMAIL,
      password: values.password ?? env.HALFPITCH_PASSWORD,
    };
  } catch (error) {
    throw error instanceof Trouble ? error : new Trouble(`${error.message}\n${USAGE}`);
  }
}
