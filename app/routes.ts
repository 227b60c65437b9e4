import { index, type RouteConfig } from '@react-router/dev/routes'

export default [index('routes/sea-trial.tsx')] satisfies RouteConfig
