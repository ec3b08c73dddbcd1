/** A rig file that the user opened. */
export interface OpenedFile {
  name: string
  text: string
  /** The host's word for where it lies; null where the host does not know. */
  place: string | null
  /** Where Save writes to; null where it has to ask. */
  target: unknown
}

export interface RecentFile {
  name: string
  folder: string
  open(): Promise<OpenedFile>
}

/** How rig files are opened and written: through the host, or with what the browser has. */
export interface FileWays {
  /** Null where the user chose none. */
  open(): Promise<OpenedFile | null>
  recent(): Promise<RecentFile[]>
  save(target: unknown, text: string): Promise<void>
  /** Null where the user chose none. */
  saveAs(name: string, text: string): Promise<Omit<OpenedFile, 'text'> | null>
  readDropped(file: File): Promise<OpenedFile>
}
