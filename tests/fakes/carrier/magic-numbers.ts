/**
 * The carrier's documented test numbers. As sender: …0006 works, …0001, …0007 and …0008 fail, the rest is not owned.
 * As recipient: each of the five fails in its own way.
 */
export const magicSenders: Record<string, number> = {
  '+15005550001': 21212,
  '+15005550007': 21606,
  '+15005550008': 21611,
}

export const magicRecipients: Record<string, number> = {
  '+15005550001': 21211,
  '+15005550002': 21612,
  '+15005550003': 21408,
  '+15005550004': 21610,
  '+15005550009': 21614,
}
