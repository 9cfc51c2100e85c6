import { defineConfig } from 'vitest/config';

export default defineConfig({
  test: {
    projects: [{ test: { name: 'engine', include: ['tests/engine/**/*.test.ts'], environment: 'node' } }],
  },
});
