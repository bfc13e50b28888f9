#include "gainsay/cli/fitted_toml.h"

#include "gainsay/cli/contenders.h"
#include "gainsay/cli/page.h"
#include "gainsay/core/print.h"

#include <cmath>

namespace gainsay::cli {

std::string toml_string(const std::string& words) {
  static constexpr char kDigits[] = "0123456789abcdef";
  std::string out = "\"";
  for (const char c : words) {
    const auto byte = static_cast<unsigned char>(c);
    if (c == '"' || c == '\\') {
      out += '\\';
      out += c;
    } else if (byte < 0x20 || byte == 0x7f) {
      out += "\\u00";
      out += kDigits[byte >> 4];
      out += kDigits[byte & 15];
    } else {
      out += c;
    }
  }
  return out + '"';
}

std::string toml_float(double value) {
  if (std::isnan(value)) return "nan";
  if (std::isinf(value)) return value < 0.0 ? "-inf" : "inf";
  const std::string text = core::print_number(value);
  return text.find_first_of(".e") == std::string::npos ? text + ".0" : text;
}

std::string fitted_toml(const Judgement& judgement) {
  std::string out = "# Fitted values of the study " + toml_string(judgement.study.title) +
                    ", written by gainsay " + judgement.version + ".\n";
  for (const Contender& contender : line_up(judgement)) {
    if (contender.outcome == nullptr) continue;
    const Outcome& outcome = *contender.outcome;
    const estimation::Fit& best = outcome.judged.search.best;
    if (best.values.empty()) continue;
    out += "\n[[fits]]\nletter = " + toml_string(contender.letter) +
           "\nname = " + toml_string(contender.name) +
           "\nfile = " + toml_string(contender.hypothesis->file) +
           "\nverdict = " + toml_string(verdict_word(contender)) +
           "\nmisfit = " + toml_float(outcome.judged.verdict.V) + "\n[fits.values]\n";
    for (std::size_t i = 0; i < best.values.size(); ++i) {
      out += toml_string(outcome.problem->unknowns.at(i).name) + " = " +
             toml_float(best.values[i]) + "\n";
    }
  }
  return out;
}

}  // namespace gainsay::cli
