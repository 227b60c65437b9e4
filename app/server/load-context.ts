import { createContext } from 'react-router'

/** The nonce that this response's policy allows scripts and styles to carry; none in development. */
export const nonceContext = createContext<string | undefined>(undefined)
