import vue from '@vitejs/plugin-vue'
import { defineConfig } from 'vitest/config'
import { nodeWorkers } from './tests/nodeWorkers.ts'

export default defineConfig({
  plugins: [vue(), nodeWorkers()],
  test: {
    include: ['tests/**/*.test.ts'],
    environment: 'node',
    testTimeout: 30_000,
    hookTimeout: 60_000,
  },
})
