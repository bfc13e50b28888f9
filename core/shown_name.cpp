#include "gainsay/core/shown_name.h"

#include "gainsay/core/tokens.h"

#include <algorithm>
#include <array>
#include <cstddef>

namespace gainsay::core {
namespace {

constexpr std::array kGreek{
    GreekLetter{"alpha", "α", "\\alpha"},     GreekLetter{"beta", "β", "\\beta"},
    GreekLetter{"gamma", "γ", "\\gamma"},     GreekLetter{"delta", "δ", "\\delta"},
    GreekLetter{"epsilon", "ε", "\\epsilon"}, GreekLetter{"zeta", "ζ", "\\zeta"},
    GreekLetter{"eta", "η", "\\eta"},         GreekLetter{"theta", "θ", "\\theta"},
    GreekLetter{"iota", "ι", "\\iota"},       GreekLetter{"kappa", "κ", "\\kappa"},
    GreekLetter{"lambda", "λ", "\\lambda"},   GreekLetter{"mu", "μ", "\\mu"},
    GreekLetter{"nu", "ν", "\\nu"},           GreekLetter{"xi", "ξ", "\\xi"},
    GreekLetter{"pi", "π", "\\pi"},           GreekLetter{"rho", "ρ", "\\rho"},
    GreekLetter{"sigma", "σ", "\\sigma"},     GreekLetter{"tau", "τ", "\\tau"},
    GreekLetter{"upsilon", "υ", "\\upsilon"}, GreekLetter{"phi", "φ", "\\phi"},
    GreekLetter{"chi", "χ", "\\chi"},         GreekLetter{"psi", "ψ", "\\psi"},
    GreekLetter{"omega", "ω", "\\omega"},     GreekLetter{"Gamma", "Γ", "\\Gamma"},
    GreekLetter{"Delta", "Δ", "\\Delta"},     GreekLetter{"Theta", "Θ", "\\Theta"},
    GreekLetter{"Lambda", "Λ", "\\Lambda"},   GreekLetter{"Xi", "Ξ", "\\Xi"},
    GreekLetter{"Pi", "Π", "\\Pi"},           GreekLetter{"Sigma", "Σ", "\\Sigma"},
    GreekLetter{"Upsilon", "Υ", "\\Upsilon"}, GreekLetter{"Phi", "Φ", "\\Phi"},
    GreekLetter{"Psi", "Ψ", "\\Psi"},         GreekLetter{"Omega", "Ω", "\\Omega"},
};

std::vector<std::string> parts_of(std::string_view name) {
  std::vector<std::string> parts(1);
  for (const char c : name) {
    if (c == '_') {
      parts.emplace_back();
    } else {
      parts.back() += c;
    }
  }
  return parts;
}

}  // namespace

ShownName split_name(std::string_view name) {
  std::vector<std::string> parts = parts_of(name);
  const auto empty = [](const std::string& part) { return part.empty(); };
  if (!is_name(name) || std::any_of(parts.begin(), parts.end(), empty)) {
    return {std::string(name), {}};
  }
  ShownName shown;
  const std::string& first = parts.front();
  const std::size_t digits = first.find_last_not_of("0123456789") + 1;
  shown.base = first.substr(0, digits);
  if (digits < first.size()) shown.below.push_back(first.substr(digits));
  shown.below.insert(shown.below.end(), parts.begin() + 1, parts.end());
  return shown;
}

const GreekLetter* find_greek_letter(std::string_view name) {
  const auto found = std::find_if(kGreek.begin(), kGreek.end(),
                                  [&](const GreekLetter& letter) { return letter.name == name; });
  return found == kGreek.end() ? nullptr : &*found;
}

bool shows_one_letter(std::string_view name) {
  const std::string base = split_name(name).base;
  return base.size() == 1 || find_greek_letter(base) != nullptr;
}

}  // namespace gainsay::core
