import { Problem } from '~/server/problem'

const refuse = () =>
  new Problem(404, 'There is nothing here; /api/openapi.json describes what there is.').response()

export const loader = refuse

export const action = refuse
