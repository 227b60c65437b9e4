import { createContext, type Dispatch, useContext } from 'react'
import type { Plan } from 'sim/plan/types'
import type { Units } from '~/features/units/units'
import type { Action } from './state'
import type { Refusals } from './wording'

export interface Adjusting {
  /** The setup as it is kept, and with what was changed. */
  kept: Plan
  plan: Plan
  units: Units
  /** Why the plan cannot be run, by parameter key. */
  refusals: Refusals
  dispatch: Dispatch<Action>
}

const AdjustingContext = createContext<Adjusting | null>(null)

export const AdjustingProvider = AdjustingContext.Provider

export function useAdjusting(): Adjusting {
  const adjusting = useContext(AdjustingContext)
  if (!adjusting) throw new Error('controls of a sea trial stand outside of one')
  return adjusting
}
