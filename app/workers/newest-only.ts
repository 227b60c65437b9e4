/**
 * One job at a time; of those asked for meanwhile only the newest is done, the others are answered
 * with null. A slider asks faster than the model answers, and only its last place matters.
 */
export function newestOnly<Job, Result>(
  work: (job: Job) => Promise<Result>,
): (job: Job) => Promise<Result | null> {
  let busy = false
  let waiting: { start: () => void; giveWay: () => void } | null = null

  async function perform(job: Job): Promise<Result> {
    busy = true
    try {
      return await work(job)
    } finally {
      busy = false
      const next = waiting
      waiting = null
      next?.start()
    }
  }

  return (job) => {
    if (!busy) return perform(job)
    waiting?.giveWay()
    return new Promise((resolve, reject) => {
      waiting = {
        start: () => perform(job).then(resolve, reject),
        giveWay: () => resolve(null),
      }
    })
  }
}
