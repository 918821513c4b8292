import { defineConfig } from 'vitest/config';

export default defineConfig({
  test: { include: ['test/**/*.test.ts'], exclude: ['test/host/**', 'node_modules/**'], testTimeout: 400_000 },
});
