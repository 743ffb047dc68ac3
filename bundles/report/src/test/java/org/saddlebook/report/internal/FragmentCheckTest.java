package org.saddlebook.report.internal;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Optional;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class FragmentCheckTest {
    @ParameterizedTest
    @ValueSource(
            strings = {
                "",
                "plain text",
                "<p>a &amp; b<br/></p>",
                "<p><a href=\"#here\">x</a></p>",
                "<svg viewBox=\"0 0 1 1\"><path d=\"M0 0\"/></svg>",
                "<table><thead><tr><th scope=\"col\">x</th></tr></thead></table>"
            })
    void acceptsWhatIsCompleteInItself(String html) {
        assertEquals(Optional.empty(), FragmentCheck.fragment(html));
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "<p>",
                "</p>",
                "<p><b></p></b>",
                "<script>x</script>",
                "<p onclick=\"x\">y</p>",
                "<p style=\"background:url(x)\">y</p>",
                "<a href=\"http://example.org\">x</a>",
                "<a href=\"javascript:x\">x</a>",
                "<img src=\"x\"/>",
                "<br>",
                "<p/>",
                "a & b",
                "a < b",
                "<svg><script>x</script></svg>",
                "<svg><path fill=\"url(http://x)\"/></svg>",
                "<svg><foreignObject></foreignObject></svg>",
                "<svg><use href=\"http://x#y\"/></svg>",
                "<p a=b>c</p>",
                "<!-- x -->",
                "<p>&copy;</p>"
            })
    void refusesWhatRunsLoadsLeadsOutOrIsBroken(String html) {
        assertTrue(FragmentCheck.fragment(html).isPresent(), html);
    }
}
