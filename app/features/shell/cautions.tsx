const cautions = [
  {
    about: 'Look-out',
    text: 'A boat that holds her course sees nothing. Keep a proper look-out by sight and hearing at all times: COLREG Rule 5.',
  },
  {
    about: 'Harness',
    text: 'She sails on without you. Wear a harness and stay clipped on: ISO 12401.',
  },
  {
    about: 'Man overboard',
    text: 'Have the means to stay on board and to get back on board rigged before you need them: ISO 15085.',
  },
  {
    about: 'Preventer',
    text: 'Off the wind, hold the boom with a preventer and keep clear of boom and loaded lines.',
  },
  {
    about: 'Tiller',
    text: 'Make the line fast so that one hand casts it off the tiller at once, under load.',
  },
]

/** In view at the foot of the drawing sheet, as the notes of a working drawing are. */
export function Cautions() {
  return (
    <section
      id="cautions"
      aria-label="Cautions"
      className="border-t border-hair px-4 py-4 md:px-margin"
    >
      <p className="text-note font-strong">
        This steers no boat. It computes, ashore, what a boat of these dimensions would do; local
        rules and qualified instruction come first.
      </p>
      <dl className="mt-2 grid gap-x-6 gap-y-2 text-note sm:grid-cols-2 lg:grid-cols-5">
        {cautions.map(({ about, text }) => (
          <div key={about}>
            <dt className="font-strong">{about}</dt>
            <dd className="text-ink-soft">{text}</dd>
          </div>
        ))}
      </dl>
    </section>
  )
}
