import { useQueryClient } from '@tanstack/react-query'
import { useEffect, useReducer, useRef } from 'react'
import { useLocation, useNavigate, useNavigationType } from 'react-router'
import type { Plan } from 'sim/plan/types'
import { decode, queryOf } from './address'
import { opened, reduce, startOf, type TrialState } from './state'
import { planQuery, usePlan } from './use-plan'

/** A dragged slider writes the address once it rests; browsers refuse to write it at every step. */
const ADDRESS_RESTS_MS = 300

/** Marks an address that this page wrote itself, so that it is not opened as if come by. */
const WRITTEN = 'written by the sea trial'

interface First {
  plan: Plan
  state: TrialState
  /** What an address without a setup means. */
  setupId: string
}

/**
 * The state with its history, kept in step with the address both ways: a change is written there,
 * and an address come by otherwise (back, forward, a link) is opened.
 */
export function useTrialState(first: First, onRemarks: (remarks: string[]) => void) {
  const [history, dispatch] = useReducer(reduce, first.state, opened)
  const { present } = history
  const { data: kept = first.plan, error } = usePlan(present.setupId, first.plan)
  const arrived = kept.setup.id === present.setupId
  const state = arrived ? present : startOf(kept.setup.id)

  const location = useLocation()
  const navigationType = useNavigationType()
  const navigate = useNavigate()
  const queries = useQueryClient()
  /** The state that the address stands for. */
  const written = useRef(first.state)
  const read = useRef(location.key)

  useEffect(() => {
    if (present === written.current) return
    const timer = setTimeout(() => {
      const replace = present.setupId === written.current.setupId
      written.current = present
      navigate({ search: queryOf(present) }, { replace, preventScrollReset: true, state: WRITTEN })
    }, ADDRESS_RESTS_MS)
    return () => clearTimeout(timer)
  }, [present, navigate])

  useEffect(() => {
    if (location.key === read.current) return
    read.current = location.key
    if (navigationType !== 'POP' && location.state === WRITTEN) return
    const query = new URLSearchParams(location.search)
    const setupId = query.get('setup') ?? first.setupId
    queries
      .ensureQueryData(planQuery(setupId))
      .then((plan) => {
        const { state: asked, remarks } = decode(query.get('trial'), plan)
        written.current = asked
        dispatch({ type: 'open', state: asked })
        onRemarks(remarks)
      })
      .catch((failure: unknown) => {
        onRemarks([
          `The setup “${setupId.slice(0, 64)}” could not be fetched; the one in hand stays. ${failure instanceof Error ? failure.message : ''}`,
        ])
      })
  }, [location, navigationType, first.setupId, queries, onRemarks])

  return { history, state, kept, arrived, error, dispatch }
}
