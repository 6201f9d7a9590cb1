const { defineConfig } = require('eslint/config');
const expo = require('eslint-config-expo/flat');

/** A folder may not reach into these others (see DEVELOPERS.md, 'Map of the house'). */
const zone = (target, from, message) => ({ target: `./${target}`, from: from.map((f) => `./${f}`), message });

module.exports = defineConfig([
  expo,
  { ignores: ['dist/**', '.expo/**', 'node_modules/**', 'public/**', 'coverage/**', 'out/**'] },
  {
    files: ['**/*.{ts,tsx,js,mjs}'],
    rules: {
      'max-lines': ['error', { max: 400, skipBlankLines: true, skipComments: true }],
      'import/no-named-as-default-member': 'off',
      'import/no-named-as-default': 'off',
      'no-restricted-properties': [
        'error',
        { object: 'process', property: 'env', message: 'Only server/config.ts reads the environment.' },
      ],
    },
  },
  {
    files: ['**/*.{ts,tsx}'],
    rules: {
      '@typescript-eslint/consistent-type-imports': 'error',
      '@typescript-eslint/no-explicit-any': 'error',
      'import/no-restricted-paths': [
        'error',
        {
          zones: [
            zone(
              'geometry',
              ['app', 'components', 'server', 'shared', 'migrations', 'seeds'],
              'geometry imports only itself',
            ),
            zone(
              'shared',
              ['app', 'components', 'server', 'migrations', 'seeds'],
              'shared sits below client and server',
            ),
            zone('components', ['app', 'server', 'migrations', 'seeds'], 'components never see server or screens'),
            zone('app', ['server', 'geometry', 'migrations', 'seeds'], 'routes hold no logic; the client talks HTTP'),
            zone('server', ['app', 'components', 'migrations', 'seeds'], 'the server never sees the UI'),
          ],
        },
      ],
    },
  },
  {
    files: ['geometry/**/*.ts'],
    rules: {
      'no-restricted-properties': [
        'error',
        { object: 'Math', property: 'random', message: 'geometry is deterministic' },
        { object: 'Date', property: 'now', message: 'geometry reads no clock' },
        { object: 'performance', property: 'now', message: 'geometry reads no clock' },
      ],
    },
  },
  {
    files: ['components/**/*.{ts,tsx}', 'app/**/*.{ts,tsx}'],
    ignores: ['components/ui/**'],
    rules: {
      'no-restricted-imports': [
        'error',
        {
          paths: [
            {
              name: 'react-native',
              importNames: ['Text', 'TextInput', 'Button', 'TouchableOpacity', 'Pressable', 'Modal'],
              message: 'Use the wrappers of components/ui.',
            },
          ],
        },
      ],
    },
  },
  {
    files: ['server/config.ts', 'scripts/**', 'tests/**', 'jest.config.js'],
    rules: { 'no-restricted-properties': 'off' },
  },
]);
