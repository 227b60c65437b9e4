declare module '*?thread' {
  /** The bundled script of a worker thread. */
  const source: string
  export default source
}
