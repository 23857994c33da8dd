import { formatBytes, formatList } from '@/lib/format'

export interface FileRules {
  /** Endings with their dot, lower case: `.pdf`. */
  endings: readonly string[]
  maxBytes: number
}

/** Why a file cannot be sent, as one sentence, or null. The server looks inside it as well. */
export function fileProblem(file: { name: string; size: number }, rules: FileRules): string | null {
  const ending = /\.[^.]+$/.exec(file.name)?.[0].toLowerCase() ?? ''
  if (!rules.endings.includes(ending)) {
    const wanted = formatList(rules.endings.map((one) => one.slice(1).toUpperCase()))
    return `${file.name} is not a ${wanted} file.`
  }
  if (file.size === 0) return `${file.name} is empty.`
  if (file.size > rules.maxBytes) {
    return `${file.name} has ${formatBytes(file.size)}; at most ${formatBytes(rules.maxBytes)} can be sent.`
  }
  return null
}
