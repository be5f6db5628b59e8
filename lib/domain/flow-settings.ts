/** What a coordinator may set about flow readings. Shares are of 1. */
export type FlowSettings = {
  /** Error of a bottle-fill time as people tell it. */
  timeErrorShare: number
  /** Error of the bottle's size. */
  bottleErrorShare: number
  /** From this share of the first flow on, a wash has brought the water back. */
  restoredShare: number
  /** Under this share a wash has not worked. */
  partlyShare: number
  /** Above this share water may be running past the fibre. */
  tooFastShare: number
}

/** Common practice, no source. */
export const flowDefaults: FlowSettings = {
  timeErrorShare: 0.1,
  bottleErrorShare: 0.05,
  restoredShare: 0.7,
  partlyShare: 0.4,
  tooFastShare: 1.3,
}

/** Error of one bottle-fill reading, as a share of it: time and bottle err independently. */
export function flowErrorShare(
  settings: Pick<FlowSettings, 'timeErrorShare' | 'bottleErrorShare'>,
): number {
  return Math.hypot(settings.timeErrorShare, settings.bottleErrorShare)
}
