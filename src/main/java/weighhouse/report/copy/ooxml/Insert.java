package weighhouse.report.copy.ooxml;

import java.util.List;

/** Puts elements into a text where the format's order wants them. */
final class Insert {
  private Insert() {}

  /** As the last child of an element, which is opened where it is empty. */
  static String last(String text, XmlText.Tag parent, String child) {
    if (parent.empty()) {
      String opened = parent.raw().substring(0, parent.raw().length() - 2).stripTrailing() + ">";
      return text.substring(0, parent.start())
          + opened
          + child
          + "</"
          + parent.name()
          + ">"
          + text.substring(parent.end());
    }
    int end = XmlText.closing(text, parent.localName(), parent.end()).start();
    return text.substring(0, end) + child + text.substring(end);
  }

  /** As a child of the root in front of the first of these elements, or last of all. */
  static String before(String text, List<String> followers, String child) {
    XmlText.Tag root = XmlText.next(text, 0);
    int depth = 0;
    for (XmlText.Tag tag = root; tag != null; tag = XmlText.next(text, tag.end())) {
      boolean top = depth == 1;
      if (top && (tag.closes() || followers.contains(tag.localName()))) {
        return text.substring(0, tag.start()) + child + text.substring(tag.start());
      }
      depth += tag.closes() ? -1 : tag.empty() ? 0 : 1;
    }
    return last(text, root, child);
  }
}
