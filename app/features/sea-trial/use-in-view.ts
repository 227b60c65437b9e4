import { useEffect, useRef, useState } from 'react'

/** Left out of the screen: the bar that stays at its foot. */
const FOOT_PX = 48

/** Whether most of an element can be seen; taken to be so until the page knows. */
export function useInView<Kind extends HTMLElement>() {
  const ref = useRef<Kind>(null)
  const [inView, setInView] = useState(true)
  useEffect(() => {
    const element = ref.current
    if (!element) return
    const observer = new IntersectionObserver(
      ([entry]) => {
        if (entry) setInView(entry.intersectionRatio >= 0.5)
      },
      { rootMargin: `0px 0px -${FOOT_PX}px 0px`, threshold: 0.5 },
    )
    observer.observe(element)
    return () => observer.disconnect()
  }, [])
  return { ref, inView }
}
