import astro from 'eslint-plugin-astro';
import tseslint from 'typescript-eslint';

const noRawSql = [
  {
    selector: "MemberExpression[object.name='sql'][property.name=/^(raw|lit|literal)$/]",
    message: 'Values go into SQL as parameters only.',
  },
];

const noFocusedTests = [
  {
    selector: 'MemberExpression[object.name=/^(it|test|describe)$/][property.name=/^(only|skip|todo|skipIf|runIf)$/]',
    message: 'Every test runs, always.',
  },
  {
    selector: 'CallExpression[callee.name=/^(xit|xtest|xdescribe|fit|fdescribe)$/]',
    message: 'Every test runs, always.',
  },
];

const noPrerender = [
  {
    selector: "ExportNamedDeclaration VariableDeclarator[id.name='prerender'][init.value=true]",
    message: 'Nothing here is prerendered: an error page that is can be made to fetch from another host.',
  },
];

const astroGates = [
  {
    selector: "JSXAttribute > JSXNamespacedName[namespace.name='define'][name.name='vars']",
    message: 'define:vars does not escape its data.',
  },
  {
    selector: "JSXAttribute > JSXNamespacedName[namespace.name='server'][name.name='defer']",
    message: 'No server islands.',
  },
  {
    selector: "JSXAttribute[name.name='slot'][value.type='JSXExpressionContainer']",
    message: 'Slot names are written out.',
  },
  {
    selector:
      "JSXOpeningElement[name.name='slot'] > JSXAttribute[name.name='name'][value.type='JSXExpressionContainer']",
    message: 'Slot names are written out.',
  },
];

const noSetHtml = {
  selector: "JSXAttribute > JSXNamespacedName[namespace.name='set'][name.name='html']",
  message: 'set:html is for the listed files only.',
};

/** Pages that show markup of our own making (a drawn chart, a formula), never text that a person typed. */
const mayShowMarkup = ['src/components/markup/**/*.astro'];

export default tseslint.config(
  { ignores: ['dist/', '.astro/', '.marram/', 'node_modules/', 'src/db/types.ts', 'tests/fixtures/'] },
  ...tseslint.configs.recommended,
  ...astro.configs.recommended,
  {
    rules: {
      eqeqeq: 'error',
      'no-var': 'error',
      'prefer-const': 'error',
      'no-eval': 'error',
      'no-implied-eval': 'error',
      'no-new-func': 'error',
      'no-console': 'error',
      'no-restricted-syntax': ['error', ...noRawSql, ...noPrerender],
      '@typescript-eslint/consistent-type-imports': 'error',
      '@typescript-eslint/no-explicit-any': 'error',
      '@typescript-eslint/no-non-null-assertion': 'off',
      '@typescript-eslint/no-unused-vars': [
        'error',
        { argsIgnorePattern: '^_', varsIgnorePattern: '^_', ignoreRestSiblings: true },
      ],
    },
  },
  {
    files: ['**/*.astro'],
    rules: {
      'no-restricted-syntax': ['error', ...noRawSql, ...noPrerender, ...astroGates, noSetHtml],
      'astro/no-set-html-directive': 'off',
    },
  },
  { files: mayShowMarkup, rules: { 'no-restricted-syntax': ['error', ...noRawSql, ...noPrerender, ...astroGates] } },
  {
    files: ['src/**/*.tsx'],
    rules: {
      'no-restricted-syntax': [
        'error',
        ...noRawSql,
        {
          selector: "JSXAttribute[name.name='dangerouslySetInnerHTML']",
          message: 'Markup is drawn by React, not set.',
        },
      ],
    },
  },
  // A schema's text is constants of its own file; nothing that a person typed exists yet.
  { files: ['db/migrations/**'], rules: { 'no-restricted-syntax': 'off' } },
  { files: ['tests/**'], rules: { 'no-restricted-syntax': ['error', ...noFocusedTests] } },
  { files: ['src/server/**', 'src/cli/**', 'db/**', 'tests/**', '*.mjs', '*.js'], rules: { 'no-console': 'off' } },
);
