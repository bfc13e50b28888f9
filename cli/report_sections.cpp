#include "gainsay/cli/report_sections.h"

#include "gainsay/cli/number_text.h"
#include "gainsay/cli/verdict_words.h"
#include "gainsay/core/balance.h"
#include "gainsay/core/print.h"

#include <algorithm>
#include <string>

namespace gainsay::cli {
namespace {

Markup sentences_of(const Contender& contender) {
  const stats::Verdict& verdict = contender.outcome->judged.verdict;
  Markup sentences;
  for (const std::string& sentence : verdict.sentences) sentences += paragraph(sentence);
  if (sentences.empty()) sentences = paragraph(capitalized(verdict.reason) + ".");
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

Markup equation(const std::string& left, const core::Expression& right) {
  const Markup math = Markup::raw("<math displaystyle=\"true\"><mrow>" + left + "<mo>=</mo>" +
                                  core::print_mathml(right) + "</mrow></math>");
  return tag("div", {{"class", "equation"}}, math);
}

std::string derivative_by_time(const std::string& name) {
  const std::string d = "<mi mathvariant=\"normal\">d</mi>";
  return "<mfrac><mrow>" + d + "<mspace width=\"0.12em\"/>" + core::mathml_name(name) +
         "</mrow><mrow>" + d + "<mi>t</mi></mrow></mfrac>";
}

constexpr std::size_t kLongEquation = 62;  // letters of a right side that half the width can hold

std::size_t longest(const core::Hypothesis& mechanism) {
  std::size_t most = 0;
  const auto take = [&](const core::Expression& right) {
    most = std::max(most, core::print_text(right).size());
  };
  for (const core::Expression& right : core::balance_by_name(mechanism)) take(right);
  for (const core::Reaction& reaction : mechanism.reactions) take(core::net(reaction));
  for (const core::Definition& definition : mechanism.definitions) take(definition.meaning);
  return most;
}

/// Derivatives in the names of reactions, then what these stand for.
Markup system_of_equations(const core::Hypothesis& mechanism) {
  const std::vector<core::Expression> derivatives = core::balance_by_name(mechanism);
  Markup all;
  for (std::size_t i = 0; i < derivatives.size(); ++i) {
    all += equation(derivative_by_time(mechanism.species[i].name), derivatives[i]);
  }
  for (const core::Reaction& reaction : mechanism.reactions) {
    all += equation(core::mathml_name(reaction.name), core::net(reaction));
  }
  for (const core::Definition& definition : mechanism.definitions) {
    all += equation(core::mathml_name(definition.name), definition.meaning);
  }
  return all;
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
    if (contender.outcome == nullptr) continue;
    const core::Hypothesis& mechanism = contender.hypothesis->mechanism;
    is_long = is_long || longest(mechanism) > kLongEquation;
    all += tag("div", {{"class", "equations " + classes(contender)}},
               tag("h3", letter_and_name(contender)) + system_of_equations(mechanism));
  }
  return section(
      {"equations", "Equations",
       paragraph("The derivative of each species by time, in the rates of the reactions; then "
                 "what these are."),
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
