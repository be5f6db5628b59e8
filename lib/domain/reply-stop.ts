/** Words of the desk's languages that ask to stop and also say that something stopped. */
const stopping =
  /\b(stop|stopp?ed|stops|arr[eê]t\w*|par[ao]\w*|dej[ao]|detuvo|bondho|thamo)\b|বন্ধ|থাম/iu

/** True if the words could mean either "stop texting" or "the water stopped": the desk asks. */
export function mayMeanStop(text: string): boolean {
  return stopping.test(text)
}
