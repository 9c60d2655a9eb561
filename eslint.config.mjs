import next from 'eslint-config-next/core-web-vitals'
import typescript from 'eslint-config-next/typescript'

/** Rules of the house that a reviewer would otherwise have to remember. */
const house = {
  rules: {
    '@typescript-eslint/no-explicit-any': 'error',
    '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', varsIgnorePattern: '^_' }],
    'no-restricted-syntax': [
      'error',
      {
        // toBeCloseTo takes a count of digits: a fraction there accepts an error of about a half.
        selector:
          "CallExpression[callee.property.name='toBeCloseTo'] > Literal.arguments:nth-child(3)[value<1][value>0]",
        message:
          'toBeCloseTo takes digits, not a tolerance: compare Math.abs(a - b) with the tolerance instead.',
      },
      {
        selector: "CallExpression[callee.property.name='literal'] > :not(Literal).arguments",
        message: 'literal() passes anything to the database: only constants may stand in it.',
      },
      {
        selector:
          "CallExpression[callee.property.name='query'] > TemplateLiteral.arguments:first-child[expressions.length>0]",
        message: 'Raw SQL takes replacements, never interpolation.',
      },
    ],
  },
}

const noDefaultExports = {
  files: ['drafting/**/*.ts', 'components/**/*.{ts,tsx}', 'db/**/*.ts', 'app/_server/**/*.ts'],
  rules: {
    'no-restricted-exports': ['error', { restrictDefaultExports: { direct: true, named: true } }],
  },
}

const config = [
  {
    ignores: ['node_modules/**', '.next*/**', '.data/**', '.cache/**', 'next-env.d.ts', 'test-results/**'],
  },
  ...next,
  ...typescript,
  house,
  noDefaultExports,
]

export default config
