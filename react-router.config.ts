import type { Config } from '@react-router/dev/config'

export default {
  ssr: true,
  buildDirectory: process.env.BUILD_FOLDER ?? 'build/application',
  future: {
    v8_middleware: true,
    v8_passThroughRequests: false,
    v8_splitRouteModules: true,
    v8_trailingSlashAwareDataRequests: true,
    v8_viteEnvironmentApi: true,
  },
} satisfies Config
