package weighhouse.workbook;

/** Whether a sheet shows; a very hidden one can only be unhidden by code. */
public enum Visibility {
  VISIBLE,
  HIDDEN,
  VERY_HIDDEN
}
