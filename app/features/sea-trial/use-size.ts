import { useEffect, useRef, useState } from 'react'
import type { Size } from '~/drawing/types'

/** The size of an element in whole pixels; until it is measured `first`, that of a common screen. */
export function useSize<Kind extends HTMLElement>(first: Size) {
  const ref = useRef<Kind>(null)
  const [size, setSize] = useState(first)
  const [measured, setMeasured] = useState(false)
  useEffect(() => {
    const element = ref.current
    if (!element) return
    const observer = new ResizeObserver(([entry]) => {
      if (!entry) return
      const width = Math.floor(entry.contentRect.width)
      const height = Math.floor(entry.contentRect.height)
      if (width === 0 || height === 0) return
      setMeasured(true)
      setSize((before) =>
        before.width === width && before.height === height ? before : { width, height },
      )
    })
    observer.observe(element)
    return () => observer.disconnect()
  }, [])
  return { ref, size, measured }
}
