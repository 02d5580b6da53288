/** The phone's store refused three times, each on a fresh connection: the page must stop and offer the export file. */
export class StorageFailed extends Error {
  override readonly name = "StorageFailed";
  constructor(cause: unknown) {
    super("this phone could not save", { cause });
  }
}

/** No event can be made before the phone has a number of its own. */
export class NotEnrolled extends Error {
  override readonly name = "NotEnrolled";
}
