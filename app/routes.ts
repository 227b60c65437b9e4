import { index, prefix, type RouteConfig, route } from '@react-router/dev/routes'

export default [
  index('routes/sea-trial.tsx'),
  route('preferences', 'routes/preferences.ts'),
  ...prefix('api', [
    route('health', 'routes/api/health.ts'),
    route('boats', 'routes/api/boats.ts'),
    route('boats/:id', 'routes/api/boat.ts'),
    route('setups', 'routes/api/setups.ts'),
    route('setups/:id', 'routes/api/setup.ts'),
    route('simulate', 'routes/api/simulate.ts'),
    route('openapi.json', 'routes/api/openapi.ts'),
    route('*', 'routes/api/unknown.ts'),
  ]),
] satisfies RouteConfig
