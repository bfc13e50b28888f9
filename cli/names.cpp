#include "gainsay/cli/names.h"

#include "gainsay/core/nearest_name.h"

#include <algorithm>

namespace gainsay::cli {

namespace {

std::string_view what_may_stand(Leans leans) {
  switch (leans) {
    case Leans::OnConstants:
      return "a known, an unknown or a function";
    case Leans::OnTheBeginning:
      return "a known, an unknown, an input or a function";
    case Leans::OnAnything:
      break;
  }
  return "a species, a reaction, an input, a known, an unknown, a name under [where] or a function";
}

}  // namespace

std::string_view word_for(NameKind kind) {
  switch (kind) {
    case NameKind::Species:
      return "species";
    case NameKind::Compartment:
      return "compartment";
    case NameKind::Reaction:
      return "reaction";
    case NameKind::Definition:
      return "name under [where]";
    case NameKind::Known:
      return "known";
    case NameKind::Unknown:
      return "unknown";
    case NameKind::Input:
      break;
  }
  return "input";
}

std::string with_a(NameKind kind) {
  const bool vowel = kind == NameKind::Unknown || kind == NameKind::Input;
  return (vowel ? "an " : "a ") + std::string(word_for(kind));
}

void NameSpace::declare(const DeclaredName& declared, Diagnostics& diagnostics) {
  const auto [taken, is_new] = names_.try_emplace(declared.name, declared);
  if (is_new) return;
  const DeclaredName& first = taken->second;
  const std::string first_place = first.place.file() + ":" + std::to_string(first.place.line);
  diagnostics.error(declared.place,
                    {"the name '" + declared.name + "' is " + with_a(declared.kind) + " here and " +
                         with_a(first.kind) + " in " + first_place,
                     "one meaning for each name of species, compartments, reactions, [where], "
                     "knowns, unknowns and inputs",
                     "rename one of the two"});
}

const DeclaredName* NameSpace::find(std::string_view name) const {
  const auto found = names_.find(name);
  return found == names_.end() ? nullptr : &found->second;
}

std::vector<std::string> NameSpace::all() const {
  std::vector<std::string> names;
  for (const auto& [name, declared] : names_) names.push_back(name);
  return names;
}

void check_names(const WrittenExpression& written, const NameSpace& known,
                 const std::string& where_else, Diagnostics& diagnostics) {
  for (const NameInText& used : written.names) {
    if (known.holds(used.name)) continue;
    const std::vector<std::string> candidates = known.all();
    const auto nearest = core::nearest_name(used.name, candidates);
    std::string expected(what_may_stand(written.leans));
    if (nearest) expected += "; nearest known name: '" + *nearest + "'";
    const bool anything = written.leans == Leans::OnAnything;
    diagnostics.error(
        used.place,
        {"unknown name '" + used.name + "' in " + written.role + where_else, expected,
         "correct the name, or add '" + used.name + "' under " +
             (anything ? "[species], [where] or [unknowns]" : "[knowns] or [unknowns]")});
  }
}

}  // namespace gainsay::cli
