package perveance.report;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.util.List;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.verapdf.gf.foundry.VeraGreenfieldFoundryProvider;
import org.verapdf.pdfa.Foundries;
import org.verapdf.pdfa.PDFAParser;
import org.verapdf.pdfa.PDFAValidator;
import org.verapdf.pdfa.flavours.PDFAFlavour;
import org.verapdf.pdfa.results.TestAssertion;
import org.verapdf.pdfa.results.ValidationResult;
import perveance.app.wording.Vocabulary;

/**
 * Published: the sheet against ISO 19005-2 level B by an independent validator. No tolerance: every
 * rule passes.
 */
class ArchiveTest {
  @BeforeAll
  static void foundry() {
    VeraGreenfieldFoundryProvider.initialise();
  }

  @Test
  void theSheetIsPdfA2b() throws Exception {
    byte[] pdf =
        new BuildSheet(SheetTrial.options(PaperSize.A4, Vocabulary.BRITISH))
            .render(SheetTrial.answer("examples/line-stage.toml"));
    try (PDFAParser parser =
            Foundries.defaultInstance()
                .createParser(new ByteArrayInputStream(pdf), PDFAFlavour.PDFA_2_B);
        PDFAValidator validator =
            Foundries.defaultInstance().createValidator(PDFAFlavour.PDFA_2_B, false)) {
      ValidationResult result = validator.validate(parser);
      List<String> faults =
          result.getTestAssertions().stream()
              .filter(a -> a.getStatus() == TestAssertion.Status.FAILED)
              .map(a -> a.getRuleId() + " " + a.getMessage())
              .distinct()
              .toList();
      assertTrue(result.isCompliant(), faults::toString);
    }
  }
}
