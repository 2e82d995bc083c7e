export default {
  singleQuote: true,
  printWidth: 100,
  trailingComma: 'all',
  overrides: [{ files: '*.md', options: { proseWrap: 'preserve' } }],
};
