import { useEffect, useRef, useState } from 'react'

/** Whether an element is on the screen; taken to be so until the page knows. */
export function useInView<Kind extends HTMLElement>() {
  const ref = useRef<Kind>(null)
  const [inView, setInView] = useState(true)
  useEffect(() => {
    const element = ref.current
    if (!element) return
    const observer = new IntersectionObserver(([entry]) => {
      if (entry) setInView(entry.isIntersecting)
    })
    observer.observe(element)
    return () => observer.disconnect()
  }, [])
  return { ref, inView }
}
