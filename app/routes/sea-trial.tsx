export function meta() {
  return [{ title: 'Sea trial · Counterhelm' }]
}

export default function SeaTrial() {
  return <h1>Sea trial</h1>
}
