package org.evenbeam.certificate;

import static org.evenbeam.wording.Words.Bundle.CERTIFICATE;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.evenbeam.logbook.certificates.CertificateData;
import org.evenbeam.logbook.certificates.CertificateRecord;
import org.evenbeam.logbook.run.RunSheet;
import org.evenbeam.verification.RunFindings;
import org.evenbeam.wording.Figures;
import org.evenbeam.wording.Sentences;
import org.evenbeam.wording.Words;

/** What a template can place, made from a certificate's record. */
final class CertificateModel {
  private final CertificateRecord certificate;
  private final CertificateData data;
  private final Words words;
  private final Sentences sentences;
  private final CertificateTimes times;
  private final Facts facts;
  private final StandardsInUse standards;
  private final CheckPointModel checkPoints;

  CertificateModel(
      CertificateRecord certificate, CertificateData data, Words words, Figures figures) {
    this.certificate = certificate;
    this.data = data;
    this.words = words;
    this.sentences = new Sentences(words, figures);
    this.times = new CertificateTimes(data.laboratory().zone());
    this.facts = new Facts(certificate, data, words, figures, times);
    this.standards = new StandardsInUse(words, figures);
    this.checkPoints = new CheckPointModel(words, figures, times);
  }

  /** Every place by its name. */
  Map<String, Object> values() {
    RunSheet sheet = data.sheet();
    RunFindings findings = sheet.findings();
    Map<String, Object> values = new LinkedHashMap<>();
    values.put("w", words.all(CERTIFICATE));
    values.put("language", data.laboratory().language());
    values.put("laboratory", Map.of("name", data.laboratory().name()));
    values.put("number", certificate.number());
    values.put("verdict", sentences.verdict(findings.verdict()));
    values.put(
        "verdictSentence",
        words.text(CERTIFICATE, "verdict." + findings.verdict().map(Enum::name).orElse("none")));
    values.put(
        "runNotes",
        findings.notes().stream().map(note -> sentences.notes().sentence(note, "")).toList());
    values.put("facts", List.of(facts.instrument(), facts.verification()));
    values.put("standards", standards.rows(sheet));
    values.put("traceability", standards.traceability(sheet));
    List<Map<String, Object>> points = new ArrayList<>();
    for (int i = 0; i < sheet.checkPoints().size(); i++) {
      points.add(checkPoints.values(i, sheet.checkPoints().get(i), sheet.instrument().unit()));
    }
    values.put("checkPoints", points);
    putSignatures(values);
    values.put("trailHead", certificate.trailHead());
    values.put("program", certificate.program());
    values.put(
        "cautions",
        List.of(
            words.text(CERTIFICATE, "caution.holds"),
            words.text(CERTIFICATE, "caution.kind"),
            words.text(CERTIFICATE, "caution.law")));
    return values;
  }

  private void putSignatures(Map<String, Object> values) {
    List<Map<String, String>> rows = new ArrayList<>();
    for (CertificateData.Signed signed : data.signatures()) {
      rows.add(
          Map.of(
              "meaning", words.name(CERTIFICATE, "meaning", signed.meaning()),
              "name", signed.name(),
              "at", times.toTheMinute(signed.at())));
    }
    values.put("signatures", rows);
    values.put("contentHash", data.signatures().get(0).contentSha256());
    data.approvalReason()
        .ifPresent(
            reason ->
                values.put("approvalReason", words.text(CERTIFICATE, "approval-reason", reason)));
    values.putIfAbsent("approvalReason", false);
  }
}
