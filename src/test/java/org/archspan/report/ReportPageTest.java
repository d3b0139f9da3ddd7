package org.archspan.report;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.archspan.table.Column;
import org.archspan.table.Table;
import org.junit.jupiter.api.Test;

class ReportPageTest {
  private static final String DRAWING = "<?xml version=\"1.0\"?><svg><clipPath id=\"clip1\"/>"
      + "<g clip-path=\"url(#clip1)\"/><use xlink:href=\"#clip1\"/></svg>";

  /** Two drawings number their clips alike; on one page each must find its own. */
  @Test
  void drawingsKeepTheirOwnClips() {
    String page = new ReportPage().figure("Base state", DRAWING).figure("Growth", DRAWING)
        .html(new ModelEcho("m.toml", "t", Map.of()), "s", "x");
    Set<String> names = new HashSet<>();
    Matcher id = Pattern.compile("\\bid=\"([^\"]*)\"").matcher(page);
    while (id.find()) {
      assertThat(names.add(id.group(1))).as("%s is given once", id.group(1)).isTrue();
    }
    assertThat(names).hasSize(2);
    Matcher use = Pattern.compile("(?:url\\(|href=\")#([^)\"]*)").matcher(page);
    int uses = 0;
    while (use.find()) {
      assertThat(names).contains(use.group(1));
      uses++;
    }
    assertThat(uses).isEqualTo(4);
    assertThat(page).doesNotContain("<?xml");
  }

  @Test
  void everythingFromTheModelIsEscaped() {
    String evil = "<img src=x onerror=\"alert(1)\">&";
    Table table = new Table(evil, List.of(Column.of("a", evil, new int[] {1}), Column.of("b", evil, List.of(evil))));
    String page = new ReportPage().figure(evil, DRAWING).table(evil, table)
        .html(new ModelEcho(evil, evil, Map.of(evil, evil)), evil, evil);
    assertThat(page).doesNotContain("<img").doesNotContain("onerror=\"")
        .contains("&lt;img src=x onerror=&quot;alert(1)&quot;&gt;&amp;");
  }

  @Test
  void tablesShowFewDigits() {
    String html = Html.table(new Table("t", List.of(Column.of("growth_time", "Myr", "", new double[] {34.41206276,
        Double.POSITIVE_INFINITY, Double.NaN}), Column.of("order", "", new int[] {0, 1, 2}))));
    assertThat(html).contains(">growth time<br>Myr</th>").contains(">34.41</td>").contains(">infinite</td>")
        .contains(">-</td>").contains(">2</td>");
  }
}
