const swc = (esModules) => [
  '@swc/jest',
  {
    jsc: {
      target: 'es2022',
      parser: esModules ? { syntax: 'ecmascript' } : { syntax: 'typescript', decorators: true },
      transform: { legacyDecorator: true, decoratorMetadata: true, useDefineForClassFields: false },
      keepClassNames: true,
    },
    module: { type: 'commonjs' },
    sourceMaps: 'inline',
  },
];

/** Packages that ship ES modules only are turned into CommonJS, which is what jest can load. */
const esModulePackages = [
  '@nestjs',
  '@garmin',
  '@date-fns',
  'date-fns',
  'nodemailer',
  'mailparser',
  'smtp-server',
  'fast-check',
  'pure-rand',
  'file-type',
  'strtok3',
  'token-types',
  'uint8array-extras',
  '@tokenizer',
  'uuid',
  'csv-parse',
  'rate-limiter-flexible',
];

module.exports = {
  rootDir: '.',
  roots: ['<rootDir>/apps/api', '<rootDir>/libs', '<rootDir>/tools'],
  testRegex: '\\.(spec|e2e-spec)\\.ts$',
  testEnvironment: 'node',
  // Booting the program with a database of its own takes seconds on a busy machine.
  testTimeout: 60_000,
  // By itself jest leaves one core idle.
  maxWorkers: '100%',
  moduleNameMapper: { '^@halfpitch/([^/]+)$': '<rootDir>/libs/$1/src/index.ts' },
  transform: { '\\.tsx?$': swc(false), '\\.m?js$': swc(true) },
  transformIgnorePatterns: [`/node_modules/(?!(?:${esModulePackages.join('|')})/)`],
};
