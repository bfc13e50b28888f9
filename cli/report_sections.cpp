#include "gainsay/cli/report_sections.h"

#include "gainsay/cli/equations.h"
#include "gainsay/cli/number_text.h"
#include "gainsay/cli/verdict_words.h"
#include "gainsay/core/print.h"

#include <string>

namespace gainsay::cli {
namespace {

Markup sentences_of(const Contender& contender) {
  const stats::Verdict& verdict = contender.outcome->judged.verdict;
  Markup sentences;
  for (const std::string& sentence : verdict.sentences)
    sentences += paragraph(with_raised_powers(sentence));
  if (sentences.empty())
    sentences = paragraph(with_raised_powers(capitalized(verdict.reason)) + ".");
  return sentences;
}

Markup described(const Page& page, bool (*which)(const Contender&)) {
  Markup list;
  for (const Contender& contender : page.contenders) {
    if (!which(contender)) continue;
    list += tag("dt", verdict_shape(contender) + letter_and_name(contender)) +
            tag("dd", sentences_of(contender));
  }
  return list;
}

Markup verdict_numbers(const Page& page) {
  NumberTable numbers;
  numbers.heads = {"hypothesis",
                   "verdict",
                   "misfit",
                   "N",
                   "k",
                   "full limit",
                   "P full",
                   "reduced limit",
                   "P reduced",
                   "order T",
                   "P order",
                   "P",
                   "misfit at tighter tolerances"};
  numbers.words = {true,  true,  false, false, false, false, false,
                   false, false, false, false, false, false};
  for (const Contender& contender : page.contenders) {
    if (contender.outcome == nullptr) continue;
    const stats::Verdict& v = contender.outcome->judged.verdict;
    numbers.rows.push_back(
        {contender.letter, verdict_word(contender), significant(v.V, 6), std::to_string(v.N),
         std::to_string(v.k), significant(v.full.value, 5), p_text(v.full.p_value),
         significant(v.reduced.value, 5), p_text(v.reduced.p_value), significant(v.order.T, 4),
         p_text(v.order.p_value), p_text(v.p_value), significant(v.V_tighter, 6)});
  }
  return table(numbers);
}

Markup models_compared(const Page& page) {
  NumberTable numbers;
  numbers.heads = {"hypothesis", "\u22122 ln L", "K",      "AIC",
                   "AICc",       "BIC",          "weight", "caught nine times in ten"};
  numbers.words = {true, false, false, false, false, false, false, false};
  for (const Contender& contender : page.contenders) {
    if (contender.outcome == nullptr) continue;
    const stats::Verdict& v = contender.outcome->judged.verdict;
    numbers.rows.push_back({contender.letter, significant(v.minus_two_ln_L, 6), significant(v.K, 4),
                            significant(v.AIC, 6), significant(v.AICc, 6), significant(v.BIC, 6),
                            significant(contender.outcome->weight, 2),
                            "all points off by " + significant(v.departure_sd, 2) + " sd"});
  }
  return table(numbers);
}

Markup shares(const Page& page) {
  NumberTable numbers;
  numbers.heads = {"hypothesis", "experiment", "readout", "points", "share of the misfit"};
  numbers.words = {true, true, true, false, false};
  for (const Contender& contender : page.contenders) {
    if (contender.outcome == nullptr) continue;
    for (const stats::Share& share : contender.outcome->judged.verdict.shares) {
      numbers.rows.push_back(
          {contender.letter, share.experiment.empty() ? "earlier work" : share.experiment,
           share.readout, std::to_string(share.points), significant(share.V, 4)});
    }
  }
  return table(numbers);
}

Markup fingerprints(const Page& page) {
  NumberTable numbers;
  numbers.heads = {"file", "SHA-256"};
  numbers.words = {true, true};
  for (const Fingerprint& print : page.judgement.fingerprints) {
    numbers.rows.push_back({print.file, print.sha256});
  }
  return table(numbers);
}

constexpr std::size_t kLongEquation = 40;  // letters of a right side that half the width can hold

bool has_long_equations(const StateSpace& form) {
  for (const EquationSection& each : form.sections) {
    for (const Equation& equation : each.equations) {
      if (core::print_text(equation.right).size() > kLongEquation) return true;
    }
  }
  return false;
}

std::string versions(const Judgement& judgement) {
  std::string words = "Written by gainsay " + judgement.version;
  for (const std::string& library : judgement.libraries) words += ", " + library;
  return words + ".";
}

}  // namespace

Markup reasons(const Page& page) {
  const Markup against = described(page, rejected);
  const Markup open = described(page, undecided);
  Markup all;
  if (!against.empty()) {
    all += section({"reasons", "Why each rejected hypothesis fails",
                    paragraph("The weightiest first, the closest hypothesis on top."),
                    tag("dl", {{"class", "reasons"}}, against)});
  }
  if (!open.empty()) {
    all += section(
        {"undecided", "Why some are undecided", Markup(), tag("dl", {{"class", "reasons"}}, open)});
  }
  return all;
}

Markup equations(const Page& page) {
  Markup all;
  bool is_long = false;
  for (const Contender& contender : page.contenders) {
    if (contender.outcome == nullptr || contender.outcome->problem == nullptr) continue;
    const StateSpace form =
        state_space(page.study(), contender.outcome->hypothesis, *contender.outcome->problem);
    is_long = is_long || has_long_equations(form);
    all += tag("div", {{"class", "system " + classes(contender)}},
               tag("h3", letter_and_name(contender)) + equations_html(form));
  }
  return section(
      {"equations", "Equations",
       paragraph("The derivative of each species by time in the rates of the reactions, what "
                 "these are, the start, and what the instruments show."),
       tag("div", {{"class", is_long ? "systems" : "systems side-by-side"}}, all)});
}

Markup tables(const Page& page) {
  const Markup content = folded("Verdicts and their tests", verdict_numbers(page)) +
                         folded("Hypotheses compared", models_compared(page)) +
                         folded("Shares of the misfit by experiment and readout", shares(page));
  return section(
      {"tables", "Tables",
       paragraph("Weights hold among those not rejected, on equal data and noise; they say "
                 "nothing about a mechanism that nobody proposed."),
       content});
}

Markup method(const Page& page) {
  const Judgement& judgement = page.judgement;
  const Markup content =
      paragraph(
          "Each hypothesis was turned into ordinary differential equations and all its unknowns "
          "were "
          "fitted to all experiments at once. The misfit is the sum of the squared residuals, each "
          "divided by its standard deviation. It is compared with a quantile of chi-square: with "
          "as "
          "many degrees of freedom as there are residuals (full limit), or less the number of "
          "unknowns "
          "that the data determine (reduced limit). The residuals must also scatter without order. "
          "Both tests share the significance in fixed parts.") +
      paragraph(
          "A rejection holds within the ranges searched and for the noise stated. Weights, "
          "intervals "
          "and shares describe the best fit that was found.") +
      paragraph(caution()) +
      paragraph(versions(judgement) + " Seed " + std::to_string(judgement.study.seed) + ".") +
      folded("Fingerprints of the files read", fingerprints(page));
  return section({"method", "Method and cautions", Markup(), content});
}

}  // namespace gainsay::cli
