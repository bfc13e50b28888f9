#include "gainsay/cli/hypothesis_files.h"

#include "gainsay/cli/amend.h"
#include "gainsay/cli/letters.h"
#include "gainsay/cli/toml_tree.h"

#include <algorithm>
#include <map>
#include <memory>
#include <optional>
#include <string>
#include <utility>

namespace gainsay::cli {

namespace {

bool is_base_only(const std::string& file) {
  return file.substr(file.rfind('/') + 1).starts_with('_');
}

// The documents of hypotheses, each parsed once, and what comes of following their bases.
class Documents {
 public:
  Documents(StudyFiles& files, Diagnostics& diagnostics)
      : files_(files), diagnostics_(diagnostics) {}

  // The document of a file with all it inherits; nothing where that was said to be wrong.
  std::optional<TomlValue> resolve(const std::string& file) {
    std::vector<std::string> chain;
    return resolve(file, whole(nullptr), chain);
  }

  // The file that this one names as its base, if any.
  std::optional<std::string> base_of(const std::string& file) {
    const auto known = parsed_.find(file);
    if (known == parsed_.end() || !known->second) return std::nullopt;
    const TomlEntry* base = known->second->find("base");
    if (base == nullptr || !base->value.is_text()) return std::nullopt;
    return StudyFiles::beside(file, base->value.text);
  }

 private:
  std::optional<TomlValue> resolve(const std::string& file, const Location& asked_at,
                                   std::vector<std::string>& chain) {
    if (std::find(chain.begin(), chain.end(), file) != chain.end()) {
      say_circle(file, asked_at, chain);
      return std::nullopt;
    }
    chain.push_back(file);
    const std::optional<TomlValue> document = parse(file, asked_at);
    if (!document) return std::nullopt;
    const TomlEntry* base = document->find("base");
    if (base == nullptr || !base->value.is_text()) {
      if (document->find("remove") != nullptr) say_nothing_to_amend(*document);
      return document;
    }
    const auto inherited =
        resolve(StudyFiles::beside(file, base->value.text), base->value.place, chain);
    if (!inherited) return std::nullopt;
    return amended(*inherited, *document, diagnostics_);
  }

  std::optional<TomlValue> parse(const std::string& file, const Location& asked_at) {
    const auto known = parsed_.find(file);
    if (known != parsed_.end()) return known->second;
    std::string why;
    const auto source = files_.read(file, why);
    if (source == nullptr) {
      const auto missing = std::make_shared<const SourceText>(SourceText{file, ""});
      diagnostics_.error(asked_at.source ? asked_at : whole(missing),
                         {"the file '" + file + "' cannot be used: " + why,
                          "a hypothesis, relative to this file", "correct the path"});
      return parsed_[file] = std::nullopt;
    }
    return parsed_[file] = read_toml(source, diagnostics_);
  }

  void say_circle(const std::string& file, const Location& at,
                  const std::vector<std::string>& chain) {
    std::string circle;
    for (auto one = std::find(chain.begin(), chain.end(), file); one != chain.end(); ++one) {
      circle += one->substr(one->rfind('/') + 1) + " -> ";
    }
    circle += file.substr(file.rfind('/') + 1);
    diagnostics_.error(at, {"the bases run in a circle: " + circle,
                            "a chain of bases that ends in a file without one",
                            "remove one `base` of the circle"});
  }

  void say_nothing_to_amend(const TomlValue& document) {
    diagnostics_.error(document.find("remove")->place,
                       {"'remove' stands in a file without a base", "base = \"other.toml\"",
                        "add the base, or delete what is to be removed"});
  }

  StudyFiles& files_;
  Diagnostics& diagnostics_;
  std::map<std::string, std::optional<TomlValue>> parsed_;
};

// The nearest file up the chain of bases that is judged itself.
std::optional<std::size_t> judged_base(const std::string& file, Documents& documents,
                                       const std::vector<HypothesisReading>& readings) {
  for (auto base = documents.base_of(file); base; base = documents.base_of(*base)) {
    for (std::size_t i = 0; i < readings.size(); ++i) {
      if (readings[i].hypothesis.file == *base) return i;
    }
  }
  return std::nullopt;
}

void require_distinct_titles(const std::vector<HypothesisReading>& readings,
                             Diagnostics& diagnostics) {
  std::map<std::string, const HypothesisReading*> titles;
  for (const HypothesisReading& reading : readings) {
    const std::string& title = reading.hypothesis.mechanism.title;
    const auto [first, is_new] = titles.try_emplace(title, &reading);
    if (is_new) continue;
    diagnostics.error(reading.title,
                      {"two hypotheses are called '" + title + "'; the other is in " +
                           first->second->hypothesis.file,
                       "a title for each hypothesis", "change one of the two titles"});
  }
}

}  // namespace

ReadHypotheses read_hypotheses(StudyFiles& files, Diagnostics& diagnostics) {
  Documents documents(files, diagnostics);
  ReadHypotheses read;
  std::size_t number = 0;
  for (const std::string& file : files.list("hypotheses", ".toml")) {
    if (is_base_only(file)) continue;
    const std::string letter = letter_of(number++);
    const auto document = documents.resolve(file);
    if (!document) {
      read.all_read = false;
      continue;
    }
    std::string why;
    read.hypotheses.push_back(
        read_hypothesis(*document, whole(files.read(file, why)), diagnostics));
    read.hypotheses.back().hypothesis.letter = letter;
  }
  for (HypothesisReading& reading : read.hypotheses) {
    reading.hypothesis.base = judged_base(reading.hypothesis.file, documents, read.hypotheses);
  }
  require_distinct_titles(read.hypotheses, diagnostics);
  return read;
}

}  // namespace gainsay::cli
