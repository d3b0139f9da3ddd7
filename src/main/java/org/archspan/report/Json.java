package org.archspan.report;

import com.google.gson.Gson;
import com.google.gson.GsonBuilder;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** Builds JSON objects in the order in which they are filled; numbers that JSON does not have become null. */
final class Json {
  private static final Gson GSON = new GsonBuilder().setPrettyPrinting().serializeNulls().disableHtmlEscaping().create();

  private final Map<String, Object> members = new LinkedHashMap<>();

  Json put(String key, double value) {
    members.put(key, number(value));
    return this;
  }

  Json put(String key, long value) {
    members.put(key, value);
    return this;
  }

  Json put(String key, boolean value) {
    members.put(key, value);
    return this;
  }

  Json put(String key, String value) {
    members.put(key, value);
    return this;
  }

  Json put(String key, Json value) {
    members.put(key, value == null ? null : value.members);
    return this;
  }

  Json put(String key, Map<String, String> value) {
    members.put(key, new LinkedHashMap<>(value));
    return this;
  }

  Json put(String key, List<?> values) {
    List<Object> plain = new ArrayList<>();
    for (Object value : values) {
      plain.add(value instanceof Json json ? json.members : value instanceof Double d ? number(d) : value);
    }
    members.put(key, plain);
    return this;
  }

  Json put(String key, double[] values) {
    List<Object> plain = new ArrayList<>();
    for (double value : values) {
      plain.add(number(value));
    }
    members.put(key, plain);
    return this;
  }

  /** A value with its unit. */
  Json put(String key, double value, String unit) {
    return put(key, new Json().put("value", value).put("unit", unit));
  }

  private static Double number(double value) {
    return Double.isFinite(value) ? (Double) value : null;
  }

  /** The document, with a final line end. */
  String text() {
    return GSON.toJson(members) + "\n";
  }
}
