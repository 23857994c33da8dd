import { sentenceStart, type Child, type Ending } from './child'
import { relativeToProject, tailOf, type DataFolder } from './folders'
import { claimDataFolder, forgetRunning, noteRunning } from './runningNote'

/** Owns the running services of one data folder: notes them, watches them, stops them in reverse order. */
export class Supervisor {
  readonly #folder: DataFolder
  readonly #children: Child[] = []
  readonly #abort = new AbortController()
  #stopping: Promise<void> | undefined
  #address: string | undefined
  #settle: (reason: string) => void = () => undefined
  /** Settles with a sentence when a service ends by itself, or a signal asks to stop. */
  readonly stopAsked: Promise<{ reason: string; failed: boolean }>

  private constructor(folder: DataFolder) {
    this.#folder = folder
    this.stopAsked = new Promise((resolve) => {
      this.#settle = (reason) => resolve({ reason, failed: true })
      for (const signal of ['SIGINT', 'SIGTERM', 'SIGHUP'] as const) {
        process.on(signal, () => {
          resolve({ reason: 'Stopping ...', failed: false })
          void this.stopAll()
        })
      }
    })
  }

  static async claim(folder: DataFolder): Promise<Supervisor> {
    await claimDataFolder(folder)
    return new Supervisor(folder)
  }

  /** Runs one start; if a stop came meanwhile, the newcomer is stopped too. */
  async add(starting: Promise<Child>): Promise<Child> {
    const child = await starting
    this.#children.push(child)
    noteRunning(this.#folder, this.#children, this.#address)
    void child.ended.then((ending) => {
      if (!this.#stopping) this.#settle(describeEnding(child, ending))
    })
    if (this.#stopping) await child.stop()
    return child
  }

  noteAddress(address: string): void {
    this.#address = address
    noteRunning(this.#folder, this.#children, address)
  }

  /** Aborts when stopping begins, so that builds and migrations under way end too. */
  get signal(): AbortSignal {
    return this.#abort.signal
  }

  /** The application first, the database last; the whole lot is given half a minute at most. */
  stopAll(): Promise<void> {
    this.#stopping ??= (async () => {
      this.#abort.abort()
      for (const child of [...this.#children].reverse()) await child.stop()
      forgetRunning(this.#folder)
    })()
    return this.#stopping
  }
}

function describeEnding(child: Child, { code, signal }: Ending): string {
  const how = signal ? `was ended by ${signal}` : `ended with code ${code ?? 'unknown'}`
  const tail = tailOf(child.logFile, 8).map((line) => `    | ${line}`)
  return [
    `${sentenceStart(child.name)} ${how}, so everything else is being stopped.`,
    ...tail,
    `Its log is ${relativeToProject(child.logFile)}; put the cause right and start again.`,
  ].join('\n  ')
}
