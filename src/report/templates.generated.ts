// Generated from templates/ by templates/generate.ts. Change a template, then: npx tsx templates/generate.ts
// @ts-nocheck
export const HTML: unknown = {"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, helper, alias1=container.strict, alias2=depth0 != null ? depth0 : (container.nullContext || {}), alias3="function", alias4=container.escapeExpression, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<!doctype html>\n<html lang=\"en\">\n<head>\n<meta charset=\"utf-8\">\n<meta name=\"viewport\" content=\"width=device-width, initial-scale=1\">\n<meta name=\"color-scheme\" content=\"light dark\">\n<meta name=\"generator\" content=\""
    + alias4((((helper = lookupProperty(helpers,"tool") || alias1(depth0, "tool", {"start":{"line":7,"column":34},"end":{"line":7,"column":38}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"tool","hash":{},"data":data,"loc":{"start":{"line":7,"column":32},"end":{"line":7,"column":40}}}) : helper)))
    + "\">\n<title>"
    + alias4((((helper = lookupProperty(helpers,"title") || alias1(depth0, "title", {"start":{"line":8,"column":9},"end":{"line":8,"column":14}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"title","hash":{},"data":data,"loc":{"start":{"line":8,"column":7},"end":{"line":8,"column":16}}}) : helper)))
    + "</title>\n<style>\n"
    + ((stack1 = container.invokePartial(lookupProperty(partials,"style"),depth0,{"name":"style","data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "")
    + "</style>\n</head>\n<body>\n<a class=\"skip\" href=\"#answer\">To the answer</a>\n"
    + ((stack1 = container.invokePartial(lookupProperty(partials,"first-screen"),depth0,{"name":"first-screen","data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "")
    + "<main>\n"
    + ((stack1 = container.invokePartial(lookupProperty(partials,"data"),depth0,{"name":"data","data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "")
    + ((stack1 = container.invokePartial(lookupProperty(partials,"tried"),depth0,{"name":"tried","data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "")
    + ((stack1 = container.invokePartial(lookupProperty(partials,"says"),depth0,{"name":"says","data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "")
    + ((stack1 = container.invokePartial(lookupProperty(partials,"trust"),depth0,{"name":"trust","data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "")
    + ((stack1 = container.invokePartial(lookupProperty(partials,"predicts"),depth0,{"name":"predicts","data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "")
    + ((stack1 = container.invokePartial(lookupProperty(partials,"careful"),depth0,{"name":"careful","data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "")
    + ((stack1 = container.invokePartial(lookupProperty(partials,"again"),depth0,{"name":"again","data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "")
    + "</main>\n<footer>\n"
    + ((stack1 = container.invokePartial(lookupProperty(partials,"mark"),depth0,{"name":"mark","data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "")
    + "<p>"
    + alias4((((helper = lookupProperty(helpers,"title") || alias1(depth0, "title", {"start":{"line":27,"column":5},"end":{"line":27,"column":10}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"title","hash":{},"data":data,"loc":{"start":{"line":27,"column":3},"end":{"line":27,"column":12}}}) : helper)))
    + ". Made by "
    + alias4((((helper = lookupProperty(helpers,"tool") || alias1(depth0, "tool", {"start":{"line":27,"column":24},"end":{"line":27,"column":28}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"tool","hash":{},"data":data,"loc":{"start":{"line":27,"column":22},"end":{"line":27,"column":30}}}) : helper)))
    + " from the study’s record and nothing else.</p>\n</footer>\n</body>\n</html>\n";
},"usePartial":true,"useData":true};
export const MARKDOWN: unknown = {"0":function(container,depth0,helpers,partials,data) {
    var stack1;

  return ((stack1 = container.lambda(depth0, depth0)) != null ? stack1 : "")
    + "\n";
},"1":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "\n| parameter | value in this run | default | given or default |\n|:--|:--|:--|:--|\n"
    + ((stack1 = lookupProperty(helpers,"each").call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(lookupProperty(depth0,"again"),"parameters"),{"name":"each","hash":{},"fn":container.program(2, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":22,"column":0},"end":{"line":24,"column":9}}})) != null ? stack1 : "");
},"2":function(container,depth0,helpers,partials,data) {
    var stack1, helper, alias1=container.strict, alias2=depth0 != null ? depth0 : (container.nullContext || {}), alias3="function", lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "| "
    + ((stack1 = (((helper = lookupProperty(helpers,"name") || alias1(depth0, "name", {"start":{"line":23,"column":4},"end":{"line":23,"column":8}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":23,"column":2},"end":{"line":23,"column":10}}}) : helper))) != null ? stack1 : "")
    + " | "
    + ((stack1 = (((helper = lookupProperty(helpers,"value") || alias1(depth0, "value", {"start":{"line":23,"column":15},"end":{"line":23,"column":20}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"value","hash":{},"data":data,"loc":{"start":{"line":23,"column":13},"end":{"line":23,"column":22}}}) : helper))) != null ? stack1 : "")
    + " | "
    + ((stack1 = (((helper = lookupProperty(helpers,"default") || alias1(depth0, "default", {"start":{"line":23,"column":27},"end":{"line":23,"column":34}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"default","hash":{},"data":data,"loc":{"start":{"line":23,"column":25},"end":{"line":23,"column":36}}}) : helper))) != null ? stack1 : "")
    + " | "
    + ((stack1 = (((helper = lookupProperty(helpers,"source") || alias1(depth0, "source", {"start":{"line":23,"column":41},"end":{"line":23,"column":47}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"source","hash":{},"data":data,"loc":{"start":{"line":23,"column":39},"end":{"line":23,"column":49}}}) : helper))) != null ? stack1 : "")
    + " |\n";
},"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, helper, alias1=container.strict, alias2=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = container.invokePartial(lookupProperty(partials,"markdown-first-screen"),depth0,{"name":"markdown-first-screen","data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = container.invokePartial(lookupProperty(partials,"markdown-candidates"),depth0,{"name":"markdown-candidates","data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = container.invokePartial(lookupProperty(partials,"markdown-coefficients"),depth0,{"name":"markdown-coefficients","data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = container.invokePartial(lookupProperty(partials,"markdown-trust"),depth0,{"name":"markdown-trust","data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "")
    + "\n---\n\n"
    + ((stack1 = container.lambda(alias1(lookupProperty(depth0,"head"), "line", {"start":{"line":11,"column":2},"end":{"line":11,"column":11}} ), depth0)) != null ? stack1 : "")
    + ". Made by "
    + ((stack1 = (((helper = lookupProperty(helpers,"tool") || alias1(depth0, "tool", {"start":{"line":11,"column":25},"end":{"line":11,"column":29}} ))),(typeof helper === "function" ? helper.call(alias2,{"name":"tool","hash":{},"data":data,"loc":{"start":{"line":11,"column":23},"end":{"line":11,"column":31}}}) : helper))) != null ? stack1 : "")
    + "; again with:\n\n```\n"
    + ((stack1 = lookupProperty(helpers,"each").call(alias2,lookupProperty(lookupProperty(depth0,"again"),"commands"),{"name":"each","hash":{},"fn":container.program(0, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":14,"column":0},"end":{"line":16,"column":9}}})) != null ? stack1 : "")
    + "```\n"
    + ((stack1 = lookupProperty(helpers,"if").call(alias2,lookupProperty(lookupProperty(depth0,"again"),"parameters"),{"name":"if","hash":{},"fn":container.program(1, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":18,"column":0},"end":{"line":25,"column":7}}})) != null ? stack1 : "");
},"usePartial":true,"useData":true};
export const COMPARISON_HTML: unknown = {"0":function(container,depth0,helpers,partials,data) {
    var helper, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<p class=\"question\">"
    + container.escapeExpression((((helper = lookupProperty(helpers,"question") || container.strict(depth0, "question", {"start":{"line":20,"column":22},"end":{"line":20,"column":30}} ))),(typeof helper === "function" ? helper.call(depth0 != null ? depth0 : (container.nullContext || {}),{"name":"question","hash":{},"data":data,"loc":{"start":{"line":20,"column":20},"end":{"line":20,"column":32}}}) : helper)))
    + "</p>\n";
},"1":function(container,depth0,helpers,partials,data) {
    return "<p>"
    + container.escapeExpression(container.lambda(depth0, depth0))
    + "</p>\n";
},"2":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<div class=\"beware\">\n<h2>Look at this first</h2>\n<ol>\n"
    + ((stack1 = lookupProperty(helpers,"each").call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(depth0,"attention"),{"name":"each","hash":{},"fn":container.program(3, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":35,"column":0},"end":{"line":37,"column":9}}})) != null ? stack1 : "")
    + "</ol>\n</div>\n";
},"3":function(container,depth0,helpers,partials,data) {
    return "<li>"
    + container.escapeExpression(container.lambda(depth0, depth0))
    + "</li>\n";
},"4":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<div class=\"acceptance\">\n<h2>Held against the earlier record</h2>\n<ul>\n"
    + ((stack1 = lookupProperty(helpers,"each").call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(depth0,"accepted"),{"name":"each","hash":{},"fn":container.program(5, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":45,"column":0},"end":{"line":47,"column":9}}})) != null ? stack1 : "")
    + "</ul>\n</div>\n";
},"5":function(container,depth0,helpers,partials,data) {
    var helper, alias1=container.strict, alias2=depth0 != null ? depth0 : (container.nullContext || {}), alias3="function", alias4=container.escapeExpression, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<li class=\""
    + alias4((((helper = lookupProperty(helpers,"word") || alias1(depth0, "word", {"start":{"line":46,"column":13},"end":{"line":46,"column":17}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"word","hash":{},"data":data,"loc":{"start":{"line":46,"column":11},"end":{"line":46,"column":19}}}) : helper)))
    + "\"><span class=\"verdict\">"
    + alias4((((helper = lookupProperty(helpers,"word") || alias1(depth0, "word", {"start":{"line":46,"column":45},"end":{"line":46,"column":49}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"word","hash":{},"data":data,"loc":{"start":{"line":46,"column":43},"end":{"line":46,"column":51}}}) : helper)))
    + "</span> "
    + alias4((((helper = lookupProperty(helpers,"sentence") || alias1(depth0, "sentence", {"start":{"line":46,"column":61},"end":{"line":46,"column":69}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"sentence","hash":{},"data":data,"loc":{"start":{"line":46,"column":59},"end":{"line":46,"column":71}}}) : helper)))
    + "</li>\n";
},"6":function(container,depth0,helpers,partials,data) {
    return "<th scope=\"col\">dates</th>";
},"7":function(container,depth0,helpers,partials,data) {
    var stack1, helper, alias1=container.strict, alias2=depth0 != null ? depth0 : (container.nullContext || {}), alias3="function", alias4=container.escapeExpression, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<tr><th scope=\"row\">"
    + alias4((((helper = lookupProperty(helpers,"when") || alias1(depth0, "when", {"start":{"line":57,"column":22},"end":{"line":57,"column":26}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"when","hash":{},"data":data,"loc":{"start":{"line":57,"column":20},"end":{"line":57,"column":28}}}) : helper)))
    + "</th><td>"
    + alias4((((helper = lookupProperty(helpers,"study") || alias1(depth0, "study", {"start":{"line":57,"column":39},"end":{"line":57,"column":44}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"study","hash":{},"data":data,"loc":{"start":{"line":57,"column":37},"end":{"line":57,"column":46}}}) : helper)))
    + "</td><td>"
    + alias4((((helper = lookupProperty(helpers,"data") || alias1(depth0, "data", {"start":{"line":57,"column":57},"end":{"line":57,"column":61}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"data","hash":{},"data":data,"loc":{"start":{"line":57,"column":55},"end":{"line":57,"column":63}}}) : helper)))
    + "</td><td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"rows") || alias1(depth0, "rows", {"start":{"line":57,"column":84},"end":{"line":57,"column":88}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"rows","hash":{},"data":data,"loc":{"start":{"line":57,"column":82},"end":{"line":57,"column":90}}}) : helper)))
    + "</td>"
    + ((stack1 = lookupProperty(helpers,"if").call(alias2,lookupProperty(lookupProperty(data,"root"),"dated"),{"name":"if","hash":{},"fn":container.program(8, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":57,"column":95},"end":{"line":57,"column":139}}})) != null ? stack1 : "")
    + "<td>"
    + alias4((((helper = lookupProperty(helpers,"chosen") || alias1(depth0, "chosen", {"start":{"line":57,"column":145},"end":{"line":57,"column":151}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"chosen","hash":{},"data":data,"loc":{"start":{"line":57,"column":143},"end":{"line":57,"column":153}}}) : helper)))
    + "</td></tr>\n";
},"8":function(container,depth0,helpers,partials,data) {
    var helper, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<td>"
    + container.escapeExpression((((helper = lookupProperty(helpers,"dates") || container.strict(depth0, "dates", {"start":{"line":57,"column":120},"end":{"line":57,"column":125}} ))),(typeof helper === "function" ? helper.call(depth0 != null ? depth0 : (container.nullContext || {}),{"name":"dates","hash":{},"data":data,"loc":{"start":{"line":57,"column":118},"end":{"line":57,"column":127}}}) : helper)))
    + "</td>";
},"9":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<p>"
    + container.escapeExpression(container.lambda(container.strict(lookupProperty(depth0,"rows"), "revised", {"start":{"line":81,"column":5},"end":{"line":81,"column":17}} ), depth0))
    + "</p>\n<div class=\"scroll long\" tabindex=\"0\" role=\"region\" aria-label=\"Revised cells\">\n<table>\n<caption>Revised cells</caption>\n<thead><tr><th scope=\"col\">row</th><th scope=\"col\">variable</th><th scope=\"col\" class=\"n\">before</th><th scope=\"col\" class=\"n\">now</th></tr></thead>\n<tbody>\n"
    + ((stack1 = lookupProperty(helpers,"each").call(alias1,lookupProperty(lookupProperty(depth0,"rows"),"revisions"),{"name":"each","hash":{},"fn":container.program(10, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":87,"column":0},"end":{"line":89,"column":9}}})) != null ? stack1 : "")
    + "</tbody>\n</table>\n</div>\n"
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(lookupProperty(depth0,"rows"),"revisionsMore"),{"name":"if","hash":{},"fn":container.program(11, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":93,"column":0},"end":{"line":95,"column":7}}})) != null ? stack1 : "");
},"10":function(container,depth0,helpers,partials,data) {
    var helper, alias1=container.strict, alias2=depth0 != null ? depth0 : (container.nullContext || {}), alias3="function", alias4=container.escapeExpression, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<tr><th scope=\"row\">"
    + alias4((((helper = lookupProperty(helpers,"row") || alias1(depth0, "row", {"start":{"line":88,"column":22},"end":{"line":88,"column":25}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"row","hash":{},"data":data,"loc":{"start":{"line":88,"column":20},"end":{"line":88,"column":27}}}) : helper)))
    + "</th><td>"
    + alias4((((helper = lookupProperty(helpers,"variable") || alias1(depth0, "variable", {"start":{"line":88,"column":38},"end":{"line":88,"column":46}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"variable","hash":{},"data":data,"loc":{"start":{"line":88,"column":36},"end":{"line":88,"column":48}}}) : helper)))
    + "</td><td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"earlier") || alias1(depth0, "earlier", {"start":{"line":88,"column":69},"end":{"line":88,"column":76}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"earlier","hash":{},"data":data,"loc":{"start":{"line":88,"column":67},"end":{"line":88,"column":78}}}) : helper)))
    + "</td><td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"later") || alias1(depth0, "later", {"start":{"line":88,"column":99},"end":{"line":88,"column":104}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"later","hash":{},"data":data,"loc":{"start":{"line":88,"column":97},"end":{"line":88,"column":106}}}) : helper)))
    + "</td></tr>\n";
},"11":function(container,depth0,helpers,partials,data) {
    var lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<p class=\"small\">"
    + container.escapeExpression(container.lambda(container.strict(lookupProperty(depth0,"rows"), "revisionsMore", {"start":{"line":94,"column":19},"end":{"line":94,"column":37}} ), depth0))
    + "</p>\n";
},"12":function(container,depth0,helpers,partials,data) {
    var lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<p class=\"small\">"
    + container.escapeExpression(container.lambda(container.strict(lookupProperty(depth0,"rows"), "addedList", {"start":{"line":98,"column":19},"end":{"line":98,"column":33}} ), depth0))
    + "</p>\n";
},"13":function(container,depth0,helpers,partials,data) {
    var lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<p class=\"small\">"
    + container.escapeExpression(container.lambda(container.strict(lookupProperty(depth0,"rows"), "removedList", {"start":{"line":101,"column":19},"end":{"line":101,"column":35}} ), depth0))
    + "</p>\n";
},"14":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<ul>\n"
    + ((stack1 = lookupProperty(helpers,"each").call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(depth0,"contract"),{"name":"each","hash":{},"fn":container.program(3, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":109,"column":0},"end":{"line":111,"column":9}}})) != null ? stack1 : "")
    + "</ul>\n";
},"15":function(container,depth0,helpers,partials,data) {
    return "<p>Levels, ranges, missing values, columns and units are as they were.</p>\n";
},"16":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<ul>\n"
    + ((stack1 = lookupProperty(helpers,"each").call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(depth0,"declaration"),{"name":"each","hash":{},"fn":container.program(3, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":122,"column":0},"end":{"line":124,"column":9}}})) != null ? stack1 : "")
    + "</ul>\n";
},"17":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<p>Every difference is taken apart in one order: the rows that are gone, then the values revised, then the rows that are new, then the declaration. Each step is a fit of its own, and the parts add up to the whole.</p>\n"
    + ((stack1 = lookupProperty(helpers,"each").call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(depth0,"models"),{"name":"each","hash":{},"fn":container.program(18, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":138,"column":0},"end":{"line":163,"column":9}}})) != null ? stack1 : "");
},"18":function(container,depth0,helpers,partials,data) {
    var stack1, helper, alias1=container.strict, alias2=depth0 != null ? depth0 : (container.nullContext || {}), alias3="function", alias4=container.escapeExpression, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<h3>"
    + alias4((((helper = lookupProperty(helpers,"heading") || alias1(depth0, "heading", {"start":{"line":139,"column":6},"end":{"line":139,"column":13}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"heading","hash":{},"data":data,"loc":{"start":{"line":139,"column":4},"end":{"line":139,"column":15}}}) : helper)))
    + "</h3>\n"
    + ((stack1 = lookupProperty(helpers,"if").call(alias2,lookupProperty(depth0,"finding"),{"name":"if","hash":{},"fn":container.program(19, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":140,"column":0},"end":{"line":142,"column":7}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias2,lookupProperty(depth0,"note"),{"name":"if","hash":{},"fn":container.program(20, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":143,"column":0},"end":{"line":145,"column":7}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias2,lookupProperty(depth0,"scatter"),{"name":"if","hash":{},"fn":container.program(21, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":146,"column":0},"end":{"line":148,"column":7}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias2,lookupProperty(depth0,"chart"),{"name":"if","hash":{},"fn":container.program(22, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":149,"column":0},"end":{"line":151,"column":7}}})) != null ? stack1 : "")
    + "<div class=\"scroll long\" tabindex=\"0\" role=\"region\" aria-label=\"Coefficients before and now\">\n<table>\n<caption>Coefficients for "
    + alias4((((helper = lookupProperty(helpers,"quantity") || alias1(depth0, "quantity", {"start":{"line":154,"column":28},"end":{"line":154,"column":36}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"quantity","hash":{},"data":data,"loc":{"start":{"line":154,"column":26},"end":{"line":154,"column":38}}}) : helper)))
    + ", before and now</caption>\n<thead><tr><th scope=\"col\">coefficient</th><th scope=\"col\" class=\"n\">before</th><th scope=\"col\" class=\"n\">now</th><th scope=\"col\" class=\"n\">difference</th><th scope=\"col\" class=\"n\">by rows gone</th><th scope=\"col\" class=\"n\">by revision</th><th scope=\"col\" class=\"n\">by new rows</th><th scope=\"col\" class=\"n\">by declaration</th><th scope=\"col\" class=\"n\">in earlier standard errors</th></tr></thead>\n<tbody>\n"
    + ((stack1 = lookupProperty(helpers,"each").call(alias2,lookupProperty(depth0,"coefficients"),{"name":"each","hash":{},"fn":container.program(23, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":157,"column":0},"end":{"line":159,"column":9}}})) != null ? stack1 : "")
    + "</tbody>\n</table>\n</div>\n";
},"19":function(container,depth0,helpers,partials,data) {
    var helper, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<p class=\"finding\">"
    + container.escapeExpression((((helper = lookupProperty(helpers,"finding") || container.strict(depth0, "finding", {"start":{"line":141,"column":21},"end":{"line":141,"column":28}} ))),(typeof helper === "function" ? helper.call(depth0 != null ? depth0 : (container.nullContext || {}),{"name":"finding","hash":{},"data":data,"loc":{"start":{"line":141,"column":19},"end":{"line":141,"column":30}}}) : helper)))
    + "</p>\n";
},"20":function(container,depth0,helpers,partials,data) {
    var helper, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<p>"
    + container.escapeExpression((((helper = lookupProperty(helpers,"note") || container.strict(depth0, "note", {"start":{"line":144,"column":5},"end":{"line":144,"column":9}} ))),(typeof helper === "function" ? helper.call(depth0 != null ? depth0 : (container.nullContext || {}),{"name":"note","hash":{},"data":data,"loc":{"start":{"line":144,"column":3},"end":{"line":144,"column":11}}}) : helper)))
    + "</p>\n";
},"21":function(container,depth0,helpers,partials,data) {
    var helper, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<p>"
    + container.escapeExpression((((helper = lookupProperty(helpers,"scatter") || container.strict(depth0, "scatter", {"start":{"line":147,"column":5},"end":{"line":147,"column":12}} ))),(typeof helper === "function" ? helper.call(depth0 != null ? depth0 : (container.nullContext || {}),{"name":"scatter","hash":{},"data":data,"loc":{"start":{"line":147,"column":3},"end":{"line":147,"column":14}}}) : helper)))
    + "</p>\n";
},"22":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = container.invokePartial(lookupProperty(partials,"figure"),lookupProperty(depth0,"chart"),{"name":"figure","data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "");
},"23":function(container,depth0,helpers,partials,data) {
    var stack1, helper, alias1=container.strict, alias2=depth0 != null ? depth0 : (container.nullContext || {}), alias3="function", alias4=container.escapeExpression, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<tr><th scope=\"row\">"
    + alias4((((helper = lookupProperty(helpers,"name") || alias1(depth0, "name", {"start":{"line":158,"column":22},"end":{"line":158,"column":26}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":158,"column":20},"end":{"line":158,"column":28}}}) : helper)))
    + ((stack1 = lookupProperty(helpers,"if").call(alias2,lookupProperty(depth0,"unit"),{"name":"if","hash":{},"fn":container.program(24, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":158,"column":28},"end":{"line":158,"column":82}}})) != null ? stack1 : "")
    + "</th><td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"before") || alias1(depth0, "before", {"start":{"line":158,"column":103},"end":{"line":158,"column":109}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"before","hash":{},"data":data,"loc":{"start":{"line":158,"column":101},"end":{"line":158,"column":111}}}) : helper)))
    + "</td><td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"after") || alias1(depth0, "after", {"start":{"line":158,"column":132},"end":{"line":158,"column":137}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"after","hash":{},"data":data,"loc":{"start":{"line":158,"column":130},"end":{"line":158,"column":139}}}) : helper)))
    + "</td><td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"difference") || alias1(depth0, "difference", {"start":{"line":158,"column":160},"end":{"line":158,"column":170}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"difference","hash":{},"data":data,"loc":{"start":{"line":158,"column":158},"end":{"line":158,"column":172}}}) : helper)))
    + "</td><td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"removed") || alias1(depth0, "removed", {"start":{"line":158,"column":193},"end":{"line":158,"column":200}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"removed","hash":{},"data":data,"loc":{"start":{"line":158,"column":191},"end":{"line":158,"column":202}}}) : helper)))
    + "</td><td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"revised") || alias1(depth0, "revised", {"start":{"line":158,"column":223},"end":{"line":158,"column":230}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"revised","hash":{},"data":data,"loc":{"start":{"line":158,"column":221},"end":{"line":158,"column":232}}}) : helper)))
    + "</td><td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"added") || alias1(depth0, "added", {"start":{"line":158,"column":253},"end":{"line":158,"column":258}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"added","hash":{},"data":data,"loc":{"start":{"line":158,"column":251},"end":{"line":158,"column":260}}}) : helper)))
    + "</td><td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"declaration") || alias1(depth0, "declaration", {"start":{"line":158,"column":281},"end":{"line":158,"column":292}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"declaration","hash":{},"data":data,"loc":{"start":{"line":158,"column":279},"end":{"line":158,"column":294}}}) : helper)))
    + "</td><td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"inErrors") || alias1(depth0, "inErrors", {"start":{"line":158,"column":315},"end":{"line":158,"column":323}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"inErrors","hash":{},"data":data,"loc":{"start":{"line":158,"column":313},"end":{"line":158,"column":325}}}) : helper)))
    + "</td></tr>\n";
},"24":function(container,depth0,helpers,partials,data) {
    var helper, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<span class=\"under\">"
    + container.escapeExpression((((helper = lookupProperty(helpers,"unit") || container.strict(depth0, "unit", {"start":{"line":158,"column":62},"end":{"line":158,"column":66}} ))),(typeof helper === "function" ? helper.call(depth0 != null ? depth0 : (container.nullContext || {}),{"name":"unit","hash":{},"data":data,"loc":{"start":{"line":158,"column":60},"end":{"line":158,"column":68}}}) : helper)))
    + "</span>";
},"25":function(container,depth0,helpers,partials,data) {
    return "<p>There is no model that could be fitted to both sets of rows.</p>\n";
},"26":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"each").call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(depth0,"newRows"),{"name":"each","hash":{},"fn":container.program(1, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":171,"column":0},"end":{"line":173,"column":9}}})) != null ? stack1 : "");
},"27":function(container,depth0,helpers,partials,data) {
    return "<p>There are no new rows that the earlier model could be held against.</p>\n";
},"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, helper, alias1=container.strict, alias2=depth0 != null ? depth0 : (container.nullContext || {}), alias3="function", alias4=container.escapeExpression, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<!doctype html>\n<html lang=\"en\">\n<head>\n<meta charset=\"utf-8\">\n<meta name=\"viewport\" content=\"width=device-width, initial-scale=1\">\n<meta name=\"color-scheme\" content=\"light dark\">\n<meta name=\"generator\" content=\""
    + alias4((((helper = lookupProperty(helpers,"tool") || alias1(depth0, "tool", {"start":{"line":7,"column":34},"end":{"line":7,"column":38}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"tool","hash":{},"data":data,"loc":{"start":{"line":7,"column":32},"end":{"line":7,"column":40}}}) : helper)))
    + "\">\n<title>"
    + alias4((((helper = lookupProperty(helpers,"title") || alias1(depth0, "title", {"start":{"line":8,"column":9},"end":{"line":8,"column":14}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"title","hash":{},"data":data,"loc":{"start":{"line":8,"column":7},"end":{"line":8,"column":16}}}) : helper)))
    + ": what changed</title>\n<style>\n"
    + ((stack1 = container.invokePartial(lookupProperty(partials,"style"),depth0,{"name":"style","data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "")
    + "</style>\n</head>\n<body>\n<a class=\"skip\" href=\"#answer\">To the answer</a>\n<header class=\"masthead\">\n<div class=\"brand\">"
    + ((stack1 = container.invokePartial(lookupProperty(partials,"mark"),depth0,{"name":"mark","data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "")
    + "</div>\n<div>\n<h1>"
    + alias4((((helper = lookupProperty(helpers,"title") || alias1(depth0, "title", {"start":{"line":18,"column":6},"end":{"line":18,"column":11}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"title","hash":{},"data":data,"loc":{"start":{"line":18,"column":4},"end":{"line":18,"column":13}}}) : helper)))
    + ": what changed</h1>\n"
    + ((stack1 = lookupProperty(helpers,"if").call(alias2,lookupProperty(depth0,"question"),{"name":"if","hash":{},"fn":container.program(0, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":19,"column":0},"end":{"line":21,"column":7}}})) != null ? stack1 : "")
    + "</div>\n</header>\n<section class=\"first\" id=\"answer\" aria-labelledby=\"answer-heading\">\n<h2 id=\"answer-heading\" class=\"quiet\">Answer</h2>\n<div class=\"answer\">\n"
    + ((stack1 = lookupProperty(helpers,"each").call(alias2,lookupProperty(depth0,"answer"),{"name":"each","hash":{},"fn":container.program(1, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":27,"column":0},"end":{"line":29,"column":9}}})) != null ? stack1 : "")
    + "</div>\n"
    + ((stack1 = lookupProperty(helpers,"if").call(alias2,lookupProperty(depth0,"attention"),{"name":"if","hash":{},"fn":container.program(2, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":31,"column":0},"end":{"line":40,"column":7}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias2,lookupProperty(depth0,"accepted"),{"name":"if","hash":{},"fn":container.program(4, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":41,"column":0},"end":{"line":50,"column":7}}})) != null ? stack1 : "")
    + "<div class=\"scroll\" tabindex=\"0\" role=\"region\" aria-label=\"The two records\">\n<table>\n<caption>The two records</caption>\n<thead><tr><th scope=\"col\"></th><th scope=\"col\">study</th><th scope=\"col\">data</th><th scope=\"col\" class=\"n\">rows used</th>"
    + ((stack1 = lookupProperty(helpers,"if").call(alias2,lookupProperty(depth0,"dated"),{"name":"if","hash":{},"fn":container.program(6, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":54,"column":123},"end":{"line":54,"column":169}}})) != null ? stack1 : "")
    + "<th scope=\"col\">chosen</th></tr></thead>\n<tbody>\n"
    + ((stack1 = lookupProperty(helpers,"each").call(alias2,lookupProperty(depth0,"sides"),{"name":"each","hash":{},"fn":container.program(7, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":56,"column":0},"end":{"line":58,"column":9}}})) != null ? stack1 : "")
    + "</tbody>\n</table>\n</div>\n<nav aria-label=\"Sections\">\n<ol>\n<li><a href=\"#rows\">Which rows changed?</a></li>\n<li><a href=\"#contract\">Did the data keep its contract?</a></li>\n<li><a href=\"#study\">Did the study change?</a></li>\n<li><a href=\"#choice\">Is the choice the same?</a></li>\n<li><a href=\"#coefficients\">What moved each coefficient?</a></li>\n<li><a href=\"#new-rows\">Do the new rows fit?</a></li>\n</ol>\n</nav>\n</section>\n<main>\n<section id=\"rows\" aria-labelledby=\"rows-heading\">\n<h2 id=\"rows-heading\"><span class=\"no\">1</span> Which rows changed?</h2>\n<p>"
    + alias4((lookupProperty(helpers,"join")||alias1(depth0, "join", {"start":{"line":76,"column":5},"end":{"line":76,"column":9}} )).call(alias2,lookupProperty(lookupProperty(depth0,"rows"),"sentences")," ",{"name":"join","hash":{},"data":data,"loc":{"start":{"line":76,"column":3},"end":{"line":76,"column":30}}}))
    + "</p>\n"
    + ((stack1 = lookupProperty(helpers,"each").call(alias2,lookupProperty(depth0,"cannotTell"),{"name":"each","hash":{},"fn":container.program(1, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":77,"column":0},"end":{"line":79,"column":9}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias2,lookupProperty(lookupProperty(depth0,"rows"),"revised"),{"name":"if","hash":{},"fn":container.program(9, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":80,"column":0},"end":{"line":96,"column":7}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias2,lookupProperty(lookupProperty(depth0,"rows"),"addedList"),{"name":"if","hash":{},"fn":container.program(12, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":97,"column":0},"end":{"line":99,"column":7}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias2,lookupProperty(lookupProperty(depth0,"rows"),"removedList"),{"name":"if","hash":{},"fn":container.program(13, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":100,"column":0},"end":{"line":102,"column":7}}})) != null ? stack1 : "")
    + "<p class=\"small\">Rows are those used: one that was read but is now left out counts as gone.</p>\n</section>\n<section id=\"contract\" aria-labelledby=\"contract-heading\">\n<h2 id=\"contract-heading\"><span class=\"no\">2</span> Did the data keep its contract?</h2>\n"
    + ((stack1 = lookupProperty(helpers,"if").call(alias2,lookupProperty(depth0,"contract"),{"name":"if","hash":{},"fn":container.program(14, data, 0),"inverse":container.program(15, data, 0),"data":data,"loc":{"start":{"line":107,"column":0},"end":{"line":115,"column":7}}})) != null ? stack1 : "")
    + "</section>\n<section id=\"study\" aria-labelledby=\"study-heading\">\n<h2 id=\"study-heading\"><span class=\"no\">3</span> Did the study change?</h2>\n<p>"
    + alias4((((helper = lookupProperty(helpers,"study") || alias1(depth0, "study", {"start":{"line":119,"column":5},"end":{"line":119,"column":10}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"study","hash":{},"data":data,"loc":{"start":{"line":119,"column":3},"end":{"line":119,"column":12}}}) : helper)))
    + "</p>\n"
    + ((stack1 = lookupProperty(helpers,"if").call(alias2,lookupProperty(depth0,"declaration"),{"name":"if","hash":{},"fn":container.program(16, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":120,"column":0},"end":{"line":126,"column":7}}})) != null ? stack1 : "")
    + "</section>\n<section id=\"choice\" aria-labelledby=\"choice-heading\">\n<h2 id=\"choice-heading\"><span class=\"no\">4</span> Is the choice the same?</h2>\n"
    + ((stack1 = lookupProperty(helpers,"each").call(alias2,lookupProperty(depth0,"choice"),{"name":"each","hash":{},"fn":container.program(1, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":130,"column":0},"end":{"line":132,"column":9}}})) != null ? stack1 : "")
    + "</section>\n<section id=\"coefficients\" aria-labelledby=\"coefficients-heading\">\n<h2 id=\"coefficients-heading\"><span class=\"no\">5</span> What moved each coefficient?</h2>\n"
    + ((stack1 = lookupProperty(helpers,"if").call(alias2,lookupProperty(depth0,"models"),{"name":"if","hash":{},"fn":container.program(17, data, 0),"inverse":container.program(25, data, 0),"data":data,"loc":{"start":{"line":136,"column":0},"end":{"line":166,"column":7}}})) != null ? stack1 : "")
    + "</section>\n<section id=\"new-rows\" aria-labelledby=\"new-rows-heading\">\n<h2 id=\"new-rows-heading\"><span class=\"no\">6</span> Do the new rows fit?</h2>\n"
    + ((stack1 = lookupProperty(helpers,"if").call(alias2,lookupProperty(depth0,"newRows"),{"name":"if","hash":{},"fn":container.program(26, data, 0),"inverse":container.program(27, data, 0),"data":data,"loc":{"start":{"line":170,"column":0},"end":{"line":176,"column":7}}})) != null ? stack1 : "")
    + "</section>\n</main>\n<footer>\n"
    + ((stack1 = container.invokePartial(lookupProperty(partials,"mark"),depth0,{"name":"mark","data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "")
    + "<p>"
    + alias4((((helper = lookupProperty(helpers,"title") || alias1(depth0, "title", {"start":{"line":181,"column":5},"end":{"line":181,"column":10}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"title","hash":{},"data":data,"loc":{"start":{"line":181,"column":3},"end":{"line":181,"column":12}}}) : helper)))
    + ". Made by "
    + alias4((((helper = lookupProperty(helpers,"tool") || alias1(depth0, "tool", {"start":{"line":181,"column":24},"end":{"line":181,"column":28}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"tool","hash":{},"data":data,"loc":{"start":{"line":181,"column":22},"end":{"line":181,"column":30}}}) : helper)))
    + " from two records of the study and the rows kept with them.</p>\n</footer>\n</body>\n</html>\n";
},"usePartial":true,"useData":true};
export const COMPARISON_MARKDOWN: unknown = {"0":function(container,depth0,helpers,partials,data) {
    var stack1;

  return ((stack1 = container.lambda(depth0, depth0)) != null ? stack1 : "")
    + "\n\n";
},"1":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "**Look at this first**\n\n"
    + ((stack1 = lookupProperty(helpers,"each").call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(depth0,"attention"),{"name":"each","hash":{},"fn":container.program(2, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":10,"column":0},"end":{"line":12,"column":9}}})) != null ? stack1 : "")
    + "\n";
},"2":function(container,depth0,helpers,partials,data) {
    var stack1;

  return "1. "
    + ((stack1 = container.lambda(depth0, depth0)) != null ? stack1 : "")
    + "\n";
},"3":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "**Held against the earlier record**\n\n"
    + ((stack1 = lookupProperty(helpers,"each").call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(depth0,"accepted"),{"name":"each","hash":{},"fn":container.program(4, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":18,"column":0},"end":{"line":20,"column":9}}})) != null ? stack1 : "")
    + "\n";
},"4":function(container,depth0,helpers,partials,data) {
    var stack1, helper, alias1=container.strict, alias2=depth0 != null ? depth0 : (container.nullContext || {}), alias3="function", lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "- "
    + ((stack1 = (((helper = lookupProperty(helpers,"word") || alias1(depth0, "word", {"start":{"line":19,"column":4},"end":{"line":19,"column":8}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"word","hash":{},"data":data,"loc":{"start":{"line":19,"column":2},"end":{"line":19,"column":10}}}) : helper))) != null ? stack1 : "")
    + ": "
    + ((stack1 = (((helper = lookupProperty(helpers,"sentence") || alias1(depth0, "sentence", {"start":{"line":19,"column":14},"end":{"line":19,"column":22}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"sentence","hash":{},"data":data,"loc":{"start":{"line":19,"column":12},"end":{"line":19,"column":24}}}) : helper))) != null ? stack1 : "")
    + "\n";
},"5":function(container,depth0,helpers,partials,data) {
    var stack1, helper, alias1=container.strict, alias2=depth0 != null ? depth0 : (container.nullContext || {}), alias3="function", lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "| "
    + ((stack1 = (((helper = lookupProperty(helpers,"when") || alias1(depth0, "when", {"start":{"line":26,"column":4},"end":{"line":26,"column":8}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"when","hash":{},"data":data,"loc":{"start":{"line":26,"column":2},"end":{"line":26,"column":10}}}) : helper))) != null ? stack1 : "")
    + " | "
    + ((stack1 = (((helper = lookupProperty(helpers,"study") || alias1(depth0, "study", {"start":{"line":26,"column":15},"end":{"line":26,"column":20}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"study","hash":{},"data":data,"loc":{"start":{"line":26,"column":13},"end":{"line":26,"column":22}}}) : helper))) != null ? stack1 : "")
    + " | "
    + ((stack1 = (((helper = lookupProperty(helpers,"data") || alias1(depth0, "data", {"start":{"line":26,"column":27},"end":{"line":26,"column":31}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"data","hash":{},"data":data,"loc":{"start":{"line":26,"column":25},"end":{"line":26,"column":33}}}) : helper))) != null ? stack1 : "")
    + " | "
    + ((stack1 = (((helper = lookupProperty(helpers,"rows") || alias1(depth0, "rows", {"start":{"line":26,"column":38},"end":{"line":26,"column":42}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"rows","hash":{},"data":data,"loc":{"start":{"line":26,"column":36},"end":{"line":26,"column":44}}}) : helper))) != null ? stack1 : "")
    + " | "
    + ((stack1 = (((helper = lookupProperty(helpers,"chosen") || alias1(depth0, "chosen", {"start":{"line":26,"column":49},"end":{"line":26,"column":55}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"chosen","hash":{},"data":data,"loc":{"start":{"line":26,"column":47},"end":{"line":26,"column":57}}}) : helper))) != null ? stack1 : "")
    + " |\n";
},"6":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = container.lambda(container.strict(lookupProperty(depth0,"rows"), "revised", {"start":{"line":30,"column":2},"end":{"line":30,"column":14}} ), depth0)) != null ? stack1 : "")
    + "\n\n";
},"7":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "## Did the data keep its contract?\n\n"
    + ((stack1 = lookupProperty(helpers,"each").call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(depth0,"contract"),{"name":"each","hash":{},"fn":container.program(8, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":36,"column":0},"end":{"line":38,"column":9}}})) != null ? stack1 : "")
    + "\n";
},"8":function(container,depth0,helpers,partials,data) {
    var stack1;

  return "- "
    + ((stack1 = container.lambda(depth0, depth0)) != null ? stack1 : "")
    + "\n";
},"9":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "## Did the study change?\n\n"
    + ((stack1 = lookupProperty(helpers,"each").call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(depth0,"declaration"),{"name":"each","hash":{},"fn":container.program(8, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":44,"column":0},"end":{"line":46,"column":9}}})) != null ? stack1 : "")
    + "\n";
},"10":function(container,depth0,helpers,partials,data) {
    var stack1, helper, alias1=container.strict, alias2=depth0 != null ? depth0 : (container.nullContext || {}), alias3="function", lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "## What moved each coefficient?\n\n"
    + ((stack1 = (((helper = lookupProperty(helpers,"heading") || alias1(depth0, "heading", {"start":{"line":58,"column":2},"end":{"line":58,"column":9}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"heading","hash":{},"data":data,"loc":{"start":{"line":58,"column":0},"end":{"line":58,"column":11}}}) : helper))) != null ? stack1 : "")
    + "."
    + ((stack1 = lookupProperty(helpers,"if").call(alias2,lookupProperty(depth0,"note"),{"name":"if","hash":{},"fn":container.program(11, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":58,"column":12},"end":{"line":58,"column":40}}})) != null ? stack1 : "")
    + " Coefficients for "
    + ((stack1 = (((helper = lookupProperty(helpers,"quantity") || alias1(depth0, "quantity", {"start":{"line":58,"column":60},"end":{"line":58,"column":68}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"quantity","hash":{},"data":data,"loc":{"start":{"line":58,"column":58},"end":{"line":58,"column":70}}}) : helper))) != null ? stack1 : "")
    + ":\n\n| coefficient | before | now | difference | by rows gone | by revision | by new rows | by declaration | in earlier standard errors |\n|:--|--:|--:|--:|--:|--:|--:|--:|--:|\n"
    + ((stack1 = lookupProperty(helpers,"each").call(alias2,lookupProperty(depth0,"coefficients"),{"name":"each","hash":{},"fn":container.program(12, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":62,"column":0},"end":{"line":64,"column":9}}})) != null ? stack1 : "")
    + "\n";
},"11":function(container,depth0,helpers,partials,data) {
    var stack1, helper, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return " "
    + ((stack1 = (((helper = lookupProperty(helpers,"note") || container.strict(depth0, "note", {"start":{"line":58,"column":27},"end":{"line":58,"column":31}} ))),(typeof helper === "function" ? helper.call(depth0 != null ? depth0 : (container.nullContext || {}),{"name":"note","hash":{},"data":data,"loc":{"start":{"line":58,"column":25},"end":{"line":58,"column":33}}}) : helper))) != null ? stack1 : "");
},"12":function(container,depth0,helpers,partials,data) {
    var stack1, helper, alias1=container.strict, alias2=depth0 != null ? depth0 : (container.nullContext || {}), alias3="function", lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "| "
    + ((stack1 = (((helper = lookupProperty(helpers,"name") || alias1(depth0, "name", {"start":{"line":63,"column":4},"end":{"line":63,"column":8}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":63,"column":2},"end":{"line":63,"column":10}}}) : helper))) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias2,lookupProperty(depth0,"unit"),{"name":"if","hash":{},"fn":container.program(13, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":63,"column":10},"end":{"line":63,"column":40}}})) != null ? stack1 : "")
    + " | "
    + ((stack1 = (((helper = lookupProperty(helpers,"before") || alias1(depth0, "before", {"start":{"line":63,"column":45},"end":{"line":63,"column":51}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"before","hash":{},"data":data,"loc":{"start":{"line":63,"column":43},"end":{"line":63,"column":53}}}) : helper))) != null ? stack1 : "")
    + " | "
    + ((stack1 = (((helper = lookupProperty(helpers,"after") || alias1(depth0, "after", {"start":{"line":63,"column":58},"end":{"line":63,"column":63}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"after","hash":{},"data":data,"loc":{"start":{"line":63,"column":56},"end":{"line":63,"column":65}}}) : helper))) != null ? stack1 : "")
    + " | "
    + ((stack1 = (((helper = lookupProperty(helpers,"difference") || alias1(depth0, "difference", {"start":{"line":63,"column":70},"end":{"line":63,"column":80}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"difference","hash":{},"data":data,"loc":{"start":{"line":63,"column":68},"end":{"line":63,"column":82}}}) : helper))) != null ? stack1 : "")
    + " | "
    + ((stack1 = (((helper = lookupProperty(helpers,"removed") || alias1(depth0, "removed", {"start":{"line":63,"column":87},"end":{"line":63,"column":94}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"removed","hash":{},"data":data,"loc":{"start":{"line":63,"column":85},"end":{"line":63,"column":96}}}) : helper))) != null ? stack1 : "")
    + " | "
    + ((stack1 = (((helper = lookupProperty(helpers,"revised") || alias1(depth0, "revised", {"start":{"line":63,"column":101},"end":{"line":63,"column":108}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"revised","hash":{},"data":data,"loc":{"start":{"line":63,"column":99},"end":{"line":63,"column":110}}}) : helper))) != null ? stack1 : "")
    + " | "
    + ((stack1 = (((helper = lookupProperty(helpers,"added") || alias1(depth0, "added", {"start":{"line":63,"column":115},"end":{"line":63,"column":120}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"added","hash":{},"data":data,"loc":{"start":{"line":63,"column":113},"end":{"line":63,"column":122}}}) : helper))) != null ? stack1 : "")
    + " | "
    + ((stack1 = (((helper = lookupProperty(helpers,"declaration") || alias1(depth0, "declaration", {"start":{"line":63,"column":127},"end":{"line":63,"column":138}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"declaration","hash":{},"data":data,"loc":{"start":{"line":63,"column":125},"end":{"line":63,"column":140}}}) : helper))) != null ? stack1 : "")
    + " | "
    + ((stack1 = (((helper = lookupProperty(helpers,"inErrors") || alias1(depth0, "inErrors", {"start":{"line":63,"column":145},"end":{"line":63,"column":153}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"inErrors","hash":{},"data":data,"loc":{"start":{"line":63,"column":143},"end":{"line":63,"column":155}}}) : helper))) != null ? stack1 : "")
    + " |\n";
},"13":function(container,depth0,helpers,partials,data) {
    var stack1, helper, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return " ("
    + ((stack1 = (((helper = lookupProperty(helpers,"unit") || container.strict(depth0, "unit", {"start":{"line":63,"column":26},"end":{"line":63,"column":30}} ))),(typeof helper === "function" ? helper.call(depth0 != null ? depth0 : (container.nullContext || {}),{"name":"unit","hash":{},"data":data,"loc":{"start":{"line":63,"column":24},"end":{"line":63,"column":32}}}) : helper))) != null ? stack1 : "")
    + ")";
},"14":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "## Do the new rows fit?\n\n"
    + ((stack1 = lookupProperty(helpers,"each").call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(depth0,"newRows"),{"name":"each","hash":{},"fn":container.program(0, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":70,"column":0},"end":{"line":73,"column":9}}})) != null ? stack1 : "");
},"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, helper, alias1=container.strict, alias2=depth0 != null ? depth0 : (container.nullContext || {}), alias3="function", lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "# "
    + ((stack1 = (((helper = lookupProperty(helpers,"title") || alias1(depth0, "title", {"start":{"line":1,"column":4},"end":{"line":1,"column":9}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"title","hash":{},"data":data,"loc":{"start":{"line":1,"column":2},"end":{"line":1,"column":11}}}) : helper))) != null ? stack1 : "")
    + ": what changed\n\n"
    + ((stack1 = lookupProperty(helpers,"each").call(alias2,lookupProperty(depth0,"answer"),{"name":"each","hash":{},"fn":container.program(0, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":3,"column":0},"end":{"line":6,"column":9}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias2,lookupProperty(depth0,"attention"),{"name":"if","hash":{},"fn":container.program(1, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":7,"column":0},"end":{"line":14,"column":7}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias2,lookupProperty(depth0,"accepted"),{"name":"if","hash":{},"fn":container.program(3, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":15,"column":0},"end":{"line":22,"column":7}}})) != null ? stack1 : "")
    + "| | study | data | rows used | chosen |\n|:--|:--|:--|--:|:--|\n"
    + ((stack1 = lookupProperty(helpers,"each").call(alias2,lookupProperty(depth0,"sides"),{"name":"each","hash":{},"fn":container.program(5, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":25,"column":0},"end":{"line":27,"column":9}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"if").call(alias2,lookupProperty(lookupProperty(depth0,"rows"),"revised"),{"name":"if","hash":{},"fn":container.program(6, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":29,"column":0},"end":{"line":32,"column":7}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias2,lookupProperty(depth0,"contract"),{"name":"if","hash":{},"fn":container.program(7, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":33,"column":0},"end":{"line":40,"column":7}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias2,lookupProperty(depth0,"declaration"),{"name":"if","hash":{},"fn":container.program(9, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":41,"column":0},"end":{"line":48,"column":7}}})) != null ? stack1 : "")
    + "## Is the choice the same?\n\n"
    + ((stack1 = lookupProperty(helpers,"each").call(alias2,lookupProperty(depth0,"choice"),{"name":"each","hash":{},"fn":container.program(0, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":51,"column":0},"end":{"line":54,"column":9}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"each").call(alias2,lookupProperty(depth0,"models"),{"name":"each","hash":{},"fn":container.program(10, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":55,"column":0},"end":{"line":66,"column":9}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias2,lookupProperty(depth0,"newRows"),{"name":"if","hash":{},"fn":container.program(14, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":67,"column":0},"end":{"line":74,"column":7}}})) != null ? stack1 : "")
    + "---\n\nMade by "
    + ((stack1 = (((helper = lookupProperty(helpers,"tool") || alias1(depth0, "tool", {"start":{"line":77,"column":10},"end":{"line":77,"column":14}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"tool","hash":{},"data":data,"loc":{"start":{"line":77,"column":8},"end":{"line":77,"column":16}}}) : helper))) != null ? stack1 : "")
    + " from two records and the rows kept with them.\n";
},"useData":true};
export const PARTIALS: Readonly<Record<string, unknown>> = {
  'again': {"0":function(container,depth0,helpers,partials,data) {
    return container.escapeExpression(container.lambda(depth0, depth0))
    + "\n";
},"1":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<div class=\"scroll\" tabindex=\"0\" role=\"region\" aria-label=\"Parameters\">\n<table>\n<caption>Parameters</caption>\n<thead><tr><th scope=\"col\">parameter</th><th scope=\"col\">value in this run</th><th scope=\"col\">default</th><th scope=\"col\">given or default</th></tr></thead>\n<tbody>\n"
    + ((stack1 = lookupProperty(helpers,"each").call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(lookupProperty(depth0,"again"),"parameters"),{"name":"each","hash":{},"fn":container.program(2, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":12,"column":0},"end":{"line":14,"column":9}}})) != null ? stack1 : "")
    + "</tbody>\n</table>\n</div>\n";
},"2":function(container,depth0,helpers,partials,data) {
    var helper, alias1=container.strict, alias2=depth0 != null ? depth0 : (container.nullContext || {}), alias3="function", alias4=container.escapeExpression, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<tr><th scope=\"row\">"
    + alias4((((helper = lookupProperty(helpers,"name") || alias1(depth0, "name", {"start":{"line":13,"column":22},"end":{"line":13,"column":26}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":13,"column":20},"end":{"line":13,"column":28}}}) : helper)))
    + "</th><td>"
    + alias4((((helper = lookupProperty(helpers,"value") || alias1(depth0, "value", {"start":{"line":13,"column":39},"end":{"line":13,"column":44}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"value","hash":{},"data":data,"loc":{"start":{"line":13,"column":37},"end":{"line":13,"column":46}}}) : helper)))
    + "</td><td>"
    + alias4((((helper = lookupProperty(helpers,"default") || alias1(depth0, "default", {"start":{"line":13,"column":57},"end":{"line":13,"column":64}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"default","hash":{},"data":data,"loc":{"start":{"line":13,"column":55},"end":{"line":13,"column":66}}}) : helper)))
    + "</td><td>"
    + alias4((((helper = lookupProperty(helpers,"source") || alias1(depth0, "source", {"start":{"line":13,"column":77},"end":{"line":13,"column":83}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"source","hash":{},"data":data,"loc":{"start":{"line":13,"column":75},"end":{"line":13,"column":85}}}) : helper)))
    + "</td></tr>\n";
},"3":function(container,depth0,helpers,partials,data) {
    var helper, alias1=container.strict, alias2=depth0 != null ? depth0 : (container.nullContext || {}), alias3="function", alias4=container.escapeExpression, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<tr><th scope=\"row\">"
    + alias4((((helper = lookupProperty(helpers,"role") || alias1(depth0, "role", {"start":{"line":25,"column":22},"end":{"line":25,"column":26}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"role","hash":{},"data":data,"loc":{"start":{"line":25,"column":20},"end":{"line":25,"column":28}}}) : helper)))
    + "</th><td>"
    + alias4((((helper = lookupProperty(helpers,"name") || alias1(depth0, "name", {"start":{"line":25,"column":39},"end":{"line":25,"column":43}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":25,"column":37},"end":{"line":25,"column":45}}}) : helper)))
    + "</td><td><code class=\"hash\">"
    + alias4((((helper = lookupProperty(helpers,"sha256") || alias1(depth0, "sha256", {"start":{"line":25,"column":75},"end":{"line":25,"column":81}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"sha256","hash":{},"data":data,"loc":{"start":{"line":25,"column":73},"end":{"line":25,"column":83}}}) : helper)))
    + "</code></td></tr>\n";
},"4":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<div class=\"scroll long\" tabindex=\"0\" role=\"region\" aria-label=\"Settings\">\n<table class=\"settings\">\n<caption>Settings in force</caption>\n<thead><tr><th scope=\"col\">setting</th><th scope=\"col\">value</th><th scope=\"col\">written or default</th></tr></thead>\n<tbody>\n"
    + ((stack1 = lookupProperty(helpers,"each").call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(lookupProperty(depth0,"again"),"settings"),{"name":"each","hash":{},"fn":container.program(5, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":37,"column":0},"end":{"line":39,"column":9}}})) != null ? stack1 : "")
    + "</tbody>\n</table>\n</div>\n";
},"5":function(container,depth0,helpers,partials,data) {
    var helper, alias1=container.strict, alias2=depth0 != null ? depth0 : (container.nullContext || {}), alias3="function", alias4=container.escapeExpression, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<tr><th scope=\"row\">"
    + alias4((((helper = lookupProperty(helpers,"key") || alias1(depth0, "key", {"start":{"line":38,"column":22},"end":{"line":38,"column":25}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"key","hash":{},"data":data,"loc":{"start":{"line":38,"column":20},"end":{"line":38,"column":27}}}) : helper)))
    + "</th><td>"
    + alias4((((helper = lookupProperty(helpers,"value") || alias1(depth0, "value", {"start":{"line":38,"column":38},"end":{"line":38,"column":43}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"value","hash":{},"data":data,"loc":{"start":{"line":38,"column":36},"end":{"line":38,"column":45}}}) : helper)))
    + "</td><td>"
    + alias4((((helper = lookupProperty(helpers,"written") || alias1(depth0, "written", {"start":{"line":38,"column":56},"end":{"line":38,"column":63}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"written","hash":{},"data":data,"loc":{"start":{"line":38,"column":54},"end":{"line":38,"column":65}}}) : helper)))
    + "</td></tr>\n";
},"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=container.strict, alias2=container.lambda, alias3=container.escapeExpression, alias4=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<section id=\"again\" aria-labelledby=\"again-heading\">\n<h2 id=\"again-heading\"><span class=\"no\">7</span> How to get this again</h2>\n<p>With "
    + alias3(alias2(alias1(lookupProperty(depth0,"again"), "tool", {"start":{"line":3,"column":10},"end":{"line":3,"column":20}} ), depth0))
    + ", the same study file and the same data give the same record and the same report, byte for byte.</p>\n<pre tabindex=\"0\" aria-label=\"Commands\"><code>"
    + ((stack1 = lookupProperty(helpers,"each").call(alias4,lookupProperty(lookupProperty(depth0,"again"),"commands"),{"name":"each","hash":{},"fn":container.program(0, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":4,"column":46},"end":{"line":5,"column":9}}})) != null ? stack1 : "")
    + "</code></pre>\n"
    + ((stack1 = lookupProperty(helpers,"if").call(alias4,lookupProperty(lookupProperty(depth0,"again"),"parameters"),{"name":"if","hash":{},"fn":container.program(1, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":6,"column":0},"end":{"line":18,"column":7}}})) != null ? stack1 : "")
    + "<div class=\"scroll\" tabindex=\"0\" role=\"region\" aria-label=\"Files and their hashes\">\n<table>\n<caption>Files</caption>\n<thead><tr><th scope=\"col\">file</th><th scope=\"col\">name</th><th scope=\"col\">SHA-256</th></tr></thead>\n<tbody>\n"
    + ((stack1 = lookupProperty(helpers,"each").call(alias4,lookupProperty(lookupProperty(depth0,"again"),"files"),{"name":"each","hash":{},"fn":container.program(3, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":24,"column":0},"end":{"line":26,"column":9}}})) != null ? stack1 : "")
    + "</tbody>\n</table>\n</div>\n<p class=\"small\">"
    + alias3(alias2(alias1(lookupProperty(depth0,"again"), "reading", {"start":{"line":30,"column":19},"end":{"line":30,"column":32}} ), depth0))
    + " Record format: "
    + alias3(alias2(alias1(lookupProperty(depth0,"again"), "format", {"start":{"line":30,"column":52},"end":{"line":30,"column":64}} ), depth0))
    + ". Full-precision numbers are in record.json and in the tables beside it.</p>\n"
    + ((stack1 = lookupProperty(helpers,"if").call(alias4,lookupProperty(lookupProperty(depth0,"again"),"settings"),{"name":"if","hash":{},"fn":container.program(4, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":31,"column":0},"end":{"line":43,"column":7}}})) != null ? stack1 : "")
    + "</section>\n";
},"useData":true},
  'careful': {"0":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<h3>Found in this run</h3>\n<dl>\n"
    + ((stack1 = lookupProperty(helpers,"each").call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(lookupProperty(depth0,"careful"),"warnings"),{"name":"each","hash":{},"fn":container.program(1, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":6,"column":0},"end":{"line":9,"column":9}}})) != null ? stack1 : "")
    + "</dl>\n<h3>Always</h3>\n";
},"1":function(container,depth0,helpers,partials,data) {
    var alias1=container.strict, alias2=depth0 != null ? depth0 : (container.nullContext || {}), alias3=container.escapeExpression, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<dt>"
    + alias3((lookupProperty(helpers,"rich")||alias1(depth0, "rich", {"start":{"line":7,"column":6},"end":{"line":7,"column":10}} )).call(alias2,lookupProperty(depth0,"about"),{"name":"rich","hash":{},"data":data,"loc":{"start":{"line":7,"column":4},"end":{"line":7,"column":18}}}))
    + "</dt>\n<dd>"
    + alias3((lookupProperty(helpers,"rich")||alias1(depth0, "rich", {"start":{"line":8,"column":6},"end":{"line":8,"column":10}} )).call(alias2,lookupProperty(depth0,"text"),{"name":"rich","hash":{},"data":data,"loc":{"start":{"line":8,"column":4},"end":{"line":8,"column":17}}}))
    + "</dd>\n";
},"2":function(container,depth0,helpers,partials,data) {
    var helper, alias1=container.strict, alias2=depth0 != null ? depth0 : (container.nullContext || {}), alias3="function", alias4=container.escapeExpression, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<dt>"
    + alias4((((helper = lookupProperty(helpers,"heading") || alias1(depth0, "heading", {"start":{"line":15,"column":6},"end":{"line":15,"column":13}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"heading","hash":{},"data":data,"loc":{"start":{"line":15,"column":4},"end":{"line":15,"column":15}}}) : helper)))
    + "</dt>\n<dd>"
    + alias4((((helper = lookupProperty(helpers,"text") || alias1(depth0, "text", {"start":{"line":16,"column":6},"end":{"line":16,"column":10}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"text","hash":{},"data":data,"loc":{"start":{"line":16,"column":4},"end":{"line":16,"column":12}}}) : helper)))
    + "</dd>\n";
},"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<section id=\"careful\" aria-labelledby=\"careful-heading\">\n<h2 id=\"careful-heading\"><span class=\"no\">6</span> What to be careful about</h2>\n"
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(lookupProperty(depth0,"careful"),"warnings"),{"name":"if","hash":{},"fn":container.program(0, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":3,"column":0},"end":{"line":12,"column":7}}})) != null ? stack1 : "")
    + "<dl>\n"
    + ((stack1 = lookupProperty(helpers,"each").call(alias1,lookupProperty(lookupProperty(depth0,"careful"),"cautions"),{"name":"each","hash":{},"fn":container.program(2, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":14,"column":0},"end":{"line":17,"column":9}}})) != null ? stack1 : "")
    + "</dl>\n</section>\n";
},"useData":true},
  'data': {"0":function(container,depth0,helpers,partials,data) {
    var lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return " They run from "
    + container.escapeExpression(container.lambda(container.strict(lookupProperty(depth0,"data"), "dates", {"start":{"line":3,"column":55},"end":{"line":3,"column":65}} ), depth0))
    + ".";
},"1":function(container,depth0,helpers,partials,data) {
    var helper, alias1=container.strict, alias2=depth0 != null ? depth0 : (container.nullContext || {}), alias3="function", alias4=container.escapeExpression, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<li class=\"loss\"><b>− "
    + alias4((((helper = lookupProperty(helpers,"rows") || alias1(depth0, "rows", {"start":{"line":7,"column":24},"end":{"line":7,"column":28}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"rows","hash":{},"data":data,"loc":{"start":{"line":7,"column":22},"end":{"line":7,"column":30}}}) : helper)))
    + "</b> <span>"
    + alias4((((helper = lookupProperty(helpers,"because") || alias1(depth0, "because", {"start":{"line":7,"column":43},"end":{"line":7,"column":50}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"because","hash":{},"data":data,"loc":{"start":{"line":7,"column":41},"end":{"line":7,"column":52}}}) : helper)))
    + "</span></li>\n";
},"2":function(container,depth0,helpers,partials,data) {
    var stack1, helper, alias1=container.strict, alias2=depth0 != null ? depth0 : (container.nullContext || {}), alias3="function", alias4=container.escapeExpression, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<tr><th scope=\"row\">"
    + alias4((((helper = lookupProperty(helpers,"name") || alias1(depth0, "name", {"start":{"line":17,"column":22},"end":{"line":17,"column":26}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":17,"column":20},"end":{"line":17,"column":28}}}) : helper)))
    + ((stack1 = lookupProperty(helpers,"if").call(alias2,lookupProperty(depth0,"labelled"),{"name":"if","hash":{},"fn":container.program(3, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":17,"column":28},"end":{"line":17,"column":87}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias2,lookupProperty(depth0,"derivedFrom"),{"name":"if","hash":{},"fn":container.program(4, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":17,"column":87},"end":{"line":17,"column":157}}})) != null ? stack1 : "")
    + "</th><td>"
    + alias4((((helper = lookupProperty(helpers,"usedAs") || alias1(depth0, "usedAs", {"start":{"line":17,"column":168},"end":{"line":17,"column":174}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"usedAs","hash":{},"data":data,"loc":{"start":{"line":17,"column":166},"end":{"line":17,"column":176}}}) : helper)))
    + "</td><td class=\"wide\">"
    + alias4((((helper = lookupProperty(helpers,"range") || alias1(depth0, "range", {"start":{"line":17,"column":200},"end":{"line":17,"column":205}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"range","hash":{},"data":data,"loc":{"start":{"line":17,"column":198},"end":{"line":17,"column":207}}}) : helper)))
    + "</td><td class=\"near\">"
    + alias4((((helper = lookupProperty(helpers,"middle") || alias1(depth0, "middle", {"start":{"line":17,"column":231},"end":{"line":17,"column":237}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"middle","hash":{},"data":data,"loc":{"start":{"line":17,"column":229},"end":{"line":17,"column":239}}}) : helper)))
    + "</td><td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"mean") || alias1(depth0, "mean", {"start":{"line":17,"column":260},"end":{"line":17,"column":264}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"mean","hash":{},"data":data,"loc":{"start":{"line":17,"column":258},"end":{"line":17,"column":266}}}) : helper)))
    + "</td><td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"missing") || alias1(depth0, "missing", {"start":{"line":17,"column":287},"end":{"line":17,"column":294}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"missing","hash":{},"data":data,"loc":{"start":{"line":17,"column":285},"end":{"line":17,"column":296}}}) : helper)))
    + "</td></tr>\n";
},"3":function(container,depth0,helpers,partials,data) {
    var helper, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<span class=\"under\">"
    + container.escapeExpression((((helper = lookupProperty(helpers,"label") || container.strict(depth0, "label", {"start":{"line":17,"column":66},"end":{"line":17,"column":71}} ))),(typeof helper === "function" ? helper.call(depth0 != null ? depth0 : (container.nullContext || {}),{"name":"label","hash":{},"data":data,"loc":{"start":{"line":17,"column":64},"end":{"line":17,"column":73}}}) : helper)))
    + "</span>";
},"4":function(container,depth0,helpers,partials,data) {
    var helper, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<span class=\"under\">= "
    + container.escapeExpression((((helper = lookupProperty(helpers,"derivedFrom") || container.strict(depth0, "derivedFrom", {"start":{"line":17,"column":130},"end":{"line":17,"column":141}} ))),(typeof helper === "function" ? helper.call(depth0 != null ? depth0 : (container.nullContext || {}),{"name":"derivedFrom","hash":{},"data":data,"loc":{"start":{"line":17,"column":128},"end":{"line":17,"column":143}}}) : helper)))
    + "</span>";
},"5":function(container,depth0,helpers,partials,data) {
    var lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return " "
    + container.escapeExpression(container.lambda(container.strict(lookupProperty(depth0,"data"), "unused", {"start":{"line":22,"column":42},"end":{"line":22,"column":53}} ), depth0));
},"6":function(container,depth0,helpers,partials,data) {
    var lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return " "
    + container.escapeExpression(container.lambda(container.strict(lookupProperty(depth0,"data"), "ignored", {"start":{"line":22,"column":85},"end":{"line":22,"column":97}} ), depth0));
},"7":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<div class=\"scroll\" tabindex=\"0\" role=\"region\" aria-label=\"Values that broke the contract\">\n<table>\n<caption>Values that broke the declared contract</caption>\n<thead><tr><th scope=\"col\" class=\"n\">row</th><th scope=\"col\">variable</th><th scope=\"col\">text in the file</th><th scope=\"col\">what is wrong</th></tr></thead>\n<tbody>\n"
    + ((stack1 = lookupProperty(helpers,"each").call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(lookupProperty(depth0,"data"),"badValues"),{"name":"each","hash":{},"fn":container.program(8, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":29,"column":0},"end":{"line":31,"column":9}}})) != null ? stack1 : "")
    + "</tbody>\n</table>\n</div>\n";
},"8":function(container,depth0,helpers,partials,data) {
    var helper, alias1=container.strict, alias2=depth0 != null ? depth0 : (container.nullContext || {}), alias3="function", alias4=container.escapeExpression, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<tr><th scope=\"row\" class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"row") || alias1(depth0, "row", {"start":{"line":30,"column":32},"end":{"line":30,"column":35}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"row","hash":{},"data":data,"loc":{"start":{"line":30,"column":30},"end":{"line":30,"column":37}}}) : helper)))
    + "</th><td>"
    + alias4((((helper = lookupProperty(helpers,"variable") || alias1(depth0, "variable", {"start":{"line":30,"column":48},"end":{"line":30,"column":56}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"variable","hash":{},"data":data,"loc":{"start":{"line":30,"column":46},"end":{"line":30,"column":58}}}) : helper)))
    + "</td><td><code>"
    + alias4((((helper = lookupProperty(helpers,"text") || alias1(depth0, "text", {"start":{"line":30,"column":75},"end":{"line":30,"column":79}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"text","hash":{},"data":data,"loc":{"start":{"line":30,"column":73},"end":{"line":30,"column":81}}}) : helper)))
    + "</code></td><td>"
    + alias4((((helper = lookupProperty(helpers,"because") || alias1(depth0, "because", {"start":{"line":30,"column":99},"end":{"line":30,"column":106}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"because","hash":{},"data":data,"loc":{"start":{"line":30,"column":97},"end":{"line":30,"column":108}}}) : helper)))
    + "</td></tr>\n";
},"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=container.strict, alias2=container.lambda, alias3=container.escapeExpression, alias4=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<section id=\"data\" aria-labelledby=\"data-heading\">\n<h2 id=\"data-heading\"><span class=\"no\">1</span> What data?</h2>\n<p>"
    + alias3(alias2(alias1(lookupProperty(depth0,"data"), "sentence", {"start":{"line":3,"column":5},"end":{"line":3,"column":18}} ), depth0))
    + ((stack1 = lookupProperty(helpers,"if").call(alias4,lookupProperty(lookupProperty(depth0,"data"),"dates"),{"name":"if","hash":{},"fn":container.program(0, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":3,"column":20},"end":{"line":3,"column":75}}})) != null ? stack1 : "")
    + "</p>\n<ol class=\"flow\" role=\"list\" aria-label=\"From rows read to rows used\">\n<li><b>"
    + alias3(alias2(alias1(lookupProperty(depth0,"data"), "rowsRead", {"start":{"line":5,"column":9},"end":{"line":5,"column":22}} ), depth0))
    + "</b> <span>rows read from "
    + alias3(alias2(alias1(lookupProperty(depth0,"data"), "file", {"start":{"line":5,"column":52},"end":{"line":5,"column":61}} ), depth0))
    + "</span></li>\n"
    + ((stack1 = lookupProperty(helpers,"each").call(alias4,lookupProperty(lookupProperty(depth0,"data"),"losses"),{"name":"each","hash":{},"fn":container.program(1, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":6,"column":0},"end":{"line":8,"column":9}}})) != null ? stack1 : "")
    + "<li class=\"used\"><b>"
    + alias3(alias2(alias1(lookupProperty(depth0,"data"), "rowsUsed", {"start":{"line":9,"column":22},"end":{"line":9,"column":35}} ), depth0))
    + "</b> <span>rows used, the same for every candidate</span></li>\n</ol>\n<div class=\"scroll long\" tabindex=\"0\" role=\"region\" aria-label=\"Variables\">\n<table>\n<caption>Variables, over the rows used</caption>\n<thead><tr><th scope=\"col\">variable</th><th scope=\"col\">used as</th><th scope=\"col\">range, or levels with rows</th><th scope=\"col\">middle half</th><th scope=\"col\" class=\"n\">mean</th><th scope=\"col\" class=\"n\">missing when read</th></tr></thead>\n<tbody>\n"
    + ((stack1 = lookupProperty(helpers,"each").call(alias4,lookupProperty(lookupProperty(depth0,"data"),"variables"),{"name":"each","hash":{},"fn":container.program(2, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":16,"column":0},"end":{"line":18,"column":9}}})) != null ? stack1 : "")
    + "</tbody>\n</table>\n</div>\n<p>"
    + alias3(alias2(alias1(lookupProperty(depth0,"data"), "contract", {"start":{"line":22,"column":5},"end":{"line":22,"column":18}} ), depth0))
    + ((stack1 = lookupProperty(helpers,"if").call(alias4,lookupProperty(lookupProperty(depth0,"data"),"unused"),{"name":"if","hash":{},"fn":container.program(5, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":22,"column":20},"end":{"line":22,"column":62}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias4,lookupProperty(lookupProperty(depth0,"data"),"ignored"),{"name":"if","hash":{},"fn":container.program(6, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":22,"column":62},"end":{"line":22,"column":106}}})) != null ? stack1 : "")
    + "</p>\n"
    + ((stack1 = lookupProperty(helpers,"if").call(alias4,lookupProperty(lookupProperty(depth0,"data"),"badValues"),{"name":"if","hash":{},"fn":container.program(7, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":23,"column":0},"end":{"line":35,"column":7}}})) != null ? stack1 : "")
    + "</section>\n";
},"useData":true},
  'figure': {"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var helper, alias1=container.strict, alias2=depth0 != null ? depth0 : (container.nullContext || {}), alias3=container.escapeExpression, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<figure>\n<div class=\"canvas\">"
    + alias3((lookupProperty(helpers,"drawing")||alias1(depth0, "drawing", {"start":{"line":2,"column":22},"end":{"line":2,"column":29}} )).call(alias2,depth0,{"name":"drawing","hash":{},"data":data,"loc":{"start":{"line":2,"column":20},"end":{"line":2,"column":36}}}))
    + "</div>\n<figcaption>"
    + alias3((((helper = lookupProperty(helpers,"caption") || alias1(depth0, "caption", {"start":{"line":3,"column":14},"end":{"line":3,"column":21}} ))),(typeof helper === "function" ? helper.call(alias2,{"name":"caption","hash":{},"data":data,"loc":{"start":{"line":3,"column":12},"end":{"line":3,"column":23}}}) : helper)))
    + "</figcaption>\n</figure>\n";
},"useData":true},
  'first-screen': {"0":function(container,depth0,helpers,partials,data) {
    var helper, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<p class=\"question\">"
    + container.escapeExpression((((helper = lookupProperty(helpers,"question") || container.strict(depth0, "question", {"start":{"line":6,"column":22},"end":{"line":6,"column":30}} ))),(typeof helper === "function" ? helper.call(depth0 != null ? depth0 : (container.nullContext || {}),{"name":"question","hash":{},"data":data,"loc":{"start":{"line":6,"column":20},"end":{"line":6,"column":32}}}) : helper)))
    + "</p>\n";
},"1":function(container,depth0,helpers,partials,data) {
    var lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<p>"
    + container.escapeExpression((lookupProperty(helpers,"rich")||container.strict(depth0, "rich", {"start":{"line":15,"column":5},"end":{"line":15,"column":9}} )).call(depth0 != null ? depth0 : (container.nullContext || {}),depth0,{"name":"rich","hash":{},"data":data,"loc":{"start":{"line":15,"column":3},"end":{"line":15,"column":16}}}))
    + "</p>\n";
},"2":function(container,depth0,helpers,partials,data) {
    var lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<p class=\"fit\">"
    + container.escapeExpression(container.lambda(container.strict(lookupProperty(depth0,"head"), "fit", {"start":{"line":18,"column":17},"end":{"line":18,"column":25}} ), depth0))
    + "</p>\n";
},"3":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<div class=\"scroll\" tabindex=\"0\" role=\"region\" aria-label=\"Predictions asked for\">\n<table class=\"asked\">\n<caption>What was asked for, with "
    + container.escapeExpression(container.lambda(container.strict(lookupProperty(depth0,"head"), "predictionConfidence", {"start":{"line":24,"column":36},"end":{"line":24,"column":61}} ), depth0))
    + " intervals for a new row</caption>\n<thead><tr><th scope=\"col\">row</th><th scope=\"col\" class=\"n\">estimate</th><th scope=\"col\" class=\"n\">interval</th></tr></thead>\n<tbody>\n"
    + ((stack1 = lookupProperty(helpers,"each").call(alias1,lookupProperty(lookupProperty(depth0,"head"),"predictions"),{"name":"each","hash":{},"fn":container.program(4, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":27,"column":0},"end":{"line":29,"column":9}}})) != null ? stack1 : "")
    + "</tbody>\n</table>\n</div>\n"
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(lookupProperty(depth0,"head"),"predictionsMore"),{"name":"if","hash":{},"fn":container.program(7, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":33,"column":0},"end":{"line":35,"column":7}}})) != null ? stack1 : "");
},"4":function(container,depth0,helpers,partials,data) {
    var stack1, helper, alias1=depth0 != null ? depth0 : (container.nullContext || {}), alias2=container.strict, alias3="function", alias4=container.escapeExpression, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<tr"
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(depth0,"total"),{"name":"if","hash":{},"fn":container.program(5, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":28,"column":3},"end":{"line":28,"column":37}}})) != null ? stack1 : "")
    + "><th scope=\"row\">"
    + alias4((((helper = lookupProperty(helpers,"label") || alias2(depth0, "label", {"start":{"line":28,"column":56},"end":{"line":28,"column":61}} ))),(typeof helper === alias3 ? helper.call(alias1,{"name":"label","hash":{},"data":data,"loc":{"start":{"line":28,"column":54},"end":{"line":28,"column":63}}}) : helper)))
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(depth0,"outside"),{"name":"if","hash":{},"fn":container.program(6, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":28,"column":63},"end":{"line":28,"column":128}}})) != null ? stack1 : "")
    + "</th><td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"estimate") || alias2(depth0, "estimate", {"start":{"line":28,"column":149},"end":{"line":28,"column":157}} ))),(typeof helper === alias3 ? helper.call(alias1,{"name":"estimate","hash":{},"data":data,"loc":{"start":{"line":28,"column":147},"end":{"line":28,"column":159}}}) : helper)))
    + "</td><td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"interval") || alias2(depth0, "interval", {"start":{"line":28,"column":180},"end":{"line":28,"column":188}} ))),(typeof helper === alias3 ? helper.call(alias1,{"name":"interval","hash":{},"data":data,"loc":{"start":{"line":28,"column":178},"end":{"line":28,"column":190}}}) : helper)))
    + "</td></tr>\n";
},"5":function(container,depth0,helpers,partials,data) {
    return " class=\"total\"";
},"6":function(container,depth0,helpers,partials,data) {
    return " <span class=\"note\">outside the data</span>";
},"7":function(container,depth0,helpers,partials,data) {
    var lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<p class=\"small\">"
    + container.escapeExpression(container.lambda(container.strict(lookupProperty(depth0,"head"), "predictionsMore", {"start":{"line":34,"column":19},"end":{"line":34,"column":39}} ), depth0))
    + "</p>\n";
},"8":function(container,depth0,helpers,partials,data) {
    var lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<li>"
    + container.escapeExpression((lookupProperty(helpers,"rich")||container.strict(depth0, "rich", {"start":{"line":43,"column":6},"end":{"line":43,"column":10}} )).call(depth0 != null ? depth0 : (container.nullContext || {}),depth0,{"name":"rich","hash":{},"data":data,"loc":{"start":{"line":43,"column":4},"end":{"line":43,"column":17}}}))
    + "</li>\n";
},"9":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<div class=\"acceptance\">\n<h2>"
    + container.escapeExpression(container.lambda(container.strict(lookupProperty(depth0,"head"), "acceptance", {"start":{"line":49,"column":6},"end":{"line":49,"column":21}} ), depth0))
    + "</h2>\n<ul>\n"
    + ((stack1 = lookupProperty(helpers,"each").call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(lookupProperty(depth0,"head"),"criteria"),{"name":"each","hash":{},"fn":container.program(10, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":51,"column":0},"end":{"line":53,"column":9}}})) != null ? stack1 : "")
    + "</ul>\n</div>\n";
},"10":function(container,depth0,helpers,partials,data) {
    var helper, alias1=container.strict, alias2=depth0 != null ? depth0 : (container.nullContext || {}), alias3="function", alias4=container.escapeExpression, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<li class=\""
    + alias4((((helper = lookupProperty(helpers,"word") || alias1(depth0, "word", {"start":{"line":52,"column":13},"end":{"line":52,"column":17}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"word","hash":{},"data":data,"loc":{"start":{"line":52,"column":11},"end":{"line":52,"column":19}}}) : helper)))
    + "\"><span class=\"verdict\">"
    + alias4((((helper = lookupProperty(helpers,"word") || alias1(depth0, "word", {"start":{"line":52,"column":45},"end":{"line":52,"column":49}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"word","hash":{},"data":data,"loc":{"start":{"line":52,"column":43},"end":{"line":52,"column":51}}}) : helper)))
    + "</span> "
    + alias4((((helper = lookupProperty(helpers,"name") || alias1(depth0, "name", {"start":{"line":52,"column":61},"end":{"line":52,"column":65}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":52,"column":59},"end":{"line":52,"column":67}}}) : helper)))
    + " "
    + alias4((((helper = lookupProperty(helpers,"value") || alias1(depth0, "value", {"start":{"line":52,"column":70},"end":{"line":52,"column":75}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"value","hash":{},"data":data,"loc":{"start":{"line":52,"column":68},"end":{"line":52,"column":77}}}) : helper)))
    + "; asked for: "
    + alias4((((helper = lookupProperty(helpers,"limit") || alias1(depth0, "limit", {"start":{"line":52,"column":92},"end":{"line":52,"column":97}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"limit","hash":{},"data":data,"loc":{"start":{"line":52,"column":90},"end":{"line":52,"column":99}}}) : helper)))
    + "</li>\n";
},"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, helper, alias1=container.strict, alias2=depth0 != null ? depth0 : (container.nullContext || {}), alias3=container.escapeExpression, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<header class=\"masthead\">\n<div class=\"brand\">"
    + ((stack1 = container.invokePartial(lookupProperty(partials,"mark"),depth0,{"name":"mark","data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "")
    + "</div>\n<div>\n<h1>"
    + alias3((((helper = lookupProperty(helpers,"title") || alias1(depth0, "title", {"start":{"line":4,"column":6},"end":{"line":4,"column":11}} ))),(typeof helper === "function" ? helper.call(alias2,{"name":"title","hash":{},"data":data,"loc":{"start":{"line":4,"column":4},"end":{"line":4,"column":13}}}) : helper)))
    + "</h1>\n"
    + ((stack1 = lookupProperty(helpers,"if").call(alias2,lookupProperty(depth0,"question"),{"name":"if","hash":{},"fn":container.program(0, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":5,"column":0},"end":{"line":7,"column":7}}})) != null ? stack1 : "")
    + "</div>\n</header>\n<section class=\"first screen\" id=\"answer\" aria-labelledby=\"answer-heading\">\n<h2 id=\"answer-heading\" class=\"quiet\">Answer</h2>\n<div class=\"told\">\n<div class=\"answer\">\n"
    + ((stack1 = lookupProperty(helpers,"each").call(alias2,lookupProperty(lookupProperty(depth0,"head"),"answer"),{"name":"each","hash":{},"fn":container.program(1, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":14,"column":0},"end":{"line":16,"column":9}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias2,lookupProperty(lookupProperty(depth0,"head"),"fit"),{"name":"if","hash":{},"fn":container.program(2, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":17,"column":0},"end":{"line":19,"column":7}}})) != null ? stack1 : "")
    + "</div>\n"
    + ((stack1 = lookupProperty(helpers,"if").call(alias2,lookupProperty(lookupProperty(depth0,"head"),"predictions"),{"name":"if","hash":{},"fn":container.program(3, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":21,"column":0},"end":{"line":36,"column":7}}})) != null ? stack1 : "")
    + "</div>\n<div class=\"beside\">\n<div class=\"beware\">\n<h2>Before you rely on this</h2>\n<ol>\n"
    + ((stack1 = lookupProperty(helpers,"each").call(alias2,lookupProperty(lookupProperty(depth0,"head"),"beware"),{"name":"each","hash":{},"fn":container.program(8, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":42,"column":0},"end":{"line":44,"column":9}}})) != null ? stack1 : "")
    + "</ol>\n</div>\n"
    + ((stack1 = lookupProperty(helpers,"if").call(alias2,lookupProperty(lookupProperty(depth0,"head"),"acceptance"),{"name":"if","hash":{},"fn":container.program(9, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":47,"column":0},"end":{"line":56,"column":7}}})) != null ? stack1 : "")
    + "</div>\n<p class=\"line\">"
    + alias3(container.lambda(alias1(lookupProperty(depth0,"head"), "line", {"start":{"line":58,"column":18},"end":{"line":58,"column":27}} ), depth0))
    + "</p>\n<nav aria-label=\"Sections\">\n<ol>\n<li><a href=\"#data\">What data?</a></li>\n<li><a href=\"#tried\">What was tried?</a></li>\n<li><a href=\"#says\">What does it say?</a></li>\n<li><a href=\"#trust\">Can it be trusted?</a></li>\n<li><a href=\"#predicts\">What does it predict?</a></li>\n<li><a href=\"#careful\">What to be careful about</a></li>\n<li><a href=\"#again\">How to get this again</a></li>\n</ol>\n</nav>\n</section>\n";
},"usePartial":true,"useData":true},
  'levels': {"0":function(container,depth0,helpers,partials,data) {
    var helper, alias1=container.strict, alias2=depth0 != null ? depth0 : (container.nullContext || {}), alias3="function", alias4=container.escapeExpression, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<tr><th scope=\"row\">"
    + alias4((((helper = lookupProperty(helpers,"level") || alias1(depth0, "level", {"start":{"line":9,"column":22},"end":{"line":9,"column":27}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"level","hash":{},"data":data,"loc":{"start":{"line":9,"column":20},"end":{"line":9,"column":29}}}) : helper)))
    + "</th><td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"rows") || alias1(depth0, "rows", {"start":{"line":9,"column":50},"end":{"line":9,"column":54}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"rows","hash":{},"data":data,"loc":{"start":{"line":9,"column":48},"end":{"line":9,"column":56}}}) : helper)))
    + "</td><td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"estimate") || alias1(depth0, "estimate", {"start":{"line":9,"column":77},"end":{"line":9,"column":85}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"estimate","hash":{},"data":data,"loc":{"start":{"line":9,"column":75},"end":{"line":9,"column":87}}}) : helper)))
    + "</td><td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"interval") || alias1(depth0, "interval", {"start":{"line":9,"column":108},"end":{"line":9,"column":116}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"interval","hash":{},"data":data,"loc":{"start":{"line":9,"column":106},"end":{"line":9,"column":118}}}) : helper)))
    + "</td></tr>\n";
},"1":function(container,depth0,helpers,partials,data) {
    var stack1, helper, alias1=container.strict, alias2=depth0 != null ? depth0 : (container.nullContext || {}), alias3="function", alias4=container.escapeExpression, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<div class=\"scroll long\" tabindex=\"0\" role=\"region\" aria-label=\""
    + alias4((((helper = lookupProperty(helpers,"heading") || alias1(depth0, "heading", {"start":{"line":15,"column":66},"end":{"line":15,"column":73}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"heading","hash":{},"data":data,"loc":{"start":{"line":15,"column":64},"end":{"line":15,"column":75}}}) : helper)))
    + ": pairs\">\n<table>\n<caption>"
    + alias4((((helper = lookupProperty(helpers,"method") || alias1(depth0, "method", {"start":{"line":17,"column":11},"end":{"line":17,"column":17}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"method","hash":{},"data":data,"loc":{"start":{"line":17,"column":9},"end":{"line":17,"column":19}}}) : helper)))
    + "</caption>\n<thead><tr><th scope=\"col\">level</th><th scope=\"col\">against</th><th scope=\"col\" class=\"n\">difference</th><th scope=\"col\" class=\"n\">interval</th><th scope=\"col\" class=\"n\">adjusted p-value</th></tr></thead>\n<tbody>\n"
    + ((stack1 = lookupProperty(helpers,"each").call(alias2,lookupProperty(depth0,"pairs"),{"name":"each","hash":{},"fn":container.program(2, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":20,"column":0},"end":{"line":22,"column":9}}})) != null ? stack1 : "")
    + "</tbody>\n</table>\n</div>\n";
},"2":function(container,depth0,helpers,partials,data) {
    var helper, alias1=container.strict, alias2=depth0 != null ? depth0 : (container.nullContext || {}), alias3="function", alias4=container.escapeExpression, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<tr><th scope=\"row\">"
    + alias4((((helper = lookupProperty(helpers,"level") || alias1(depth0, "level", {"start":{"line":21,"column":22},"end":{"line":21,"column":27}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"level","hash":{},"data":data,"loc":{"start":{"line":21,"column":20},"end":{"line":21,"column":29}}}) : helper)))
    + "</th><td>"
    + alias4((((helper = lookupProperty(helpers,"other") || alias1(depth0, "other", {"start":{"line":21,"column":40},"end":{"line":21,"column":45}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"other","hash":{},"data":data,"loc":{"start":{"line":21,"column":38},"end":{"line":21,"column":47}}}) : helper)))
    + "</td><td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"estimate") || alias1(depth0, "estimate", {"start":{"line":21,"column":68},"end":{"line":21,"column":76}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"estimate","hash":{},"data":data,"loc":{"start":{"line":21,"column":66},"end":{"line":21,"column":78}}}) : helper)))
    + "</td><td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"interval") || alias1(depth0, "interval", {"start":{"line":21,"column":99},"end":{"line":21,"column":107}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"interval","hash":{},"data":data,"loc":{"start":{"line":21,"column":97},"end":{"line":21,"column":109}}}) : helper)))
    + "</td><td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"pValue") || alias1(depth0, "pValue", {"start":{"line":21,"column":130},"end":{"line":21,"column":136}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"pValue","hash":{},"data":data,"loc":{"start":{"line":21,"column":128},"end":{"line":21,"column":138}}}) : helper)))
    + "</td></tr>\n";
},"3":function(container,depth0,helpers,partials,data) {
    var helper, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<p class=\"small\">"
    + container.escapeExpression((((helper = lookupProperty(helpers,"pairsNote") || container.strict(depth0, "pairsNote", {"start":{"line":28,"column":19},"end":{"line":28,"column":28}} ))),(typeof helper === "function" ? helper.call(depth0 != null ? depth0 : (container.nullContext || {}),{"name":"pairsNote","hash":{},"data":data,"loc":{"start":{"line":28,"column":17},"end":{"line":28,"column":30}}}) : helper)))
    + "</p>\n";
},"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, helper, alias1=container.strict, alias2=depth0 != null ? depth0 : (container.nullContext || {}), alias3="function", alias4=container.escapeExpression, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<details class=\"both\">\n<summary>"
    + alias4((((helper = lookupProperty(helpers,"heading") || alias1(depth0, "heading", {"start":{"line":2,"column":11},"end":{"line":2,"column":18}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"heading","hash":{},"data":data,"loc":{"start":{"line":2,"column":9},"end":{"line":2,"column":20}}}) : helper)))
    + "</summary>\n<div class=\"scroll\" tabindex=\"0\" role=\"region\" aria-label=\""
    + alias4((((helper = lookupProperty(helpers,"heading") || alias1(depth0, "heading", {"start":{"line":3,"column":61},"end":{"line":3,"column":68}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"heading","hash":{},"data":data,"loc":{"start":{"line":3,"column":59},"end":{"line":3,"column":70}}}) : helper)))
    + ": expected at each level\">\n<table>\n<caption>Expected "
    + alias4((((helper = lookupProperty(helpers,"quantity") || alias1(depth0, "quantity", {"start":{"line":5,"column":20},"end":{"line":5,"column":28}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"quantity","hash":{},"data":data,"loc":{"start":{"line":5,"column":18},"end":{"line":5,"column":30}}}) : helper)))
    + ". "
    + alias4((((helper = lookupProperty(helpers,"held") || alias1(depth0, "held", {"start":{"line":5,"column":34},"end":{"line":5,"column":38}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"held","hash":{},"data":data,"loc":{"start":{"line":5,"column":32},"end":{"line":5,"column":40}}}) : helper)))
    + "</caption>\n<thead><tr><th scope=\"col\">level</th><th scope=\"col\" class=\"n\">rows</th><th scope=\"col\" class=\"n\">expected</th><th scope=\"col\" class=\"n\">interval</th></tr></thead>\n<tbody>\n"
    + ((stack1 = lookupProperty(helpers,"each").call(alias2,lookupProperty(depth0,"means"),{"name":"each","hash":{},"fn":container.program(0, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":8,"column":0},"end":{"line":10,"column":9}}})) != null ? stack1 : "")
    + "</tbody>\n</table>\n</div>\n"
    + ((stack1 = lookupProperty(helpers,"if").call(alias2,lookupProperty(depth0,"pairs"),{"name":"if","hash":{},"fn":container.program(1, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":14,"column":0},"end":{"line":26,"column":7}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias2,lookupProperty(depth0,"pairsNote"),{"name":"if","hash":{},"fn":container.program(3, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":27,"column":0},"end":{"line":29,"column":7}}})) != null ? stack1 : "")
    + "</details>\n";
},"useData":true},
  'mark': {"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return "<svg class=\"mark\" viewBox=\"0 0 20 44\" width=\"20\" height=\"44\" aria-hidden=\"true\" focusable=\"false\"><path class=\"string\" d=\"M10 1V22\"/><path class=\"weight\" d=\"M7.5 21h5v3h2.5v6.5L10 43 5 30.5V24h2.5z\"/></svg>\n";
},"useData":true},
  'markdown-candidates': {"0":function(container,depth0,helpers,partials,data) {
    var stack1;

  return ((stack1 = container.lambda(depth0, depth0)) != null ? stack1 : "")
    + "\n";
},"1":function(container,depth0,helpers,partials,data,blockParams,depths) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "| rank | candidate | coefficients | "
    + ((stack1 = container.lambda(container.strict(lookupProperty(depth0,"tried"), "criterion", {"start":{"line":9,"column":38},"end":{"line":9,"column":53}} ), depth0)) != null ? stack1 : "")
    + " | from the best |"
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(lookupProperty(depth0,"tried"),"hasError"),{"name":"if","hash":{},"fn":container.program(2, data, 0, blockParams, depths),"inverse":container.noop,"data":data,"loc":{"start":{"line":9,"column":73},"end":{"line":9,"column":127}}})) != null ? stack1 : "")
    + " adjusted R² | admitted? |\n|--:|:--|--:|--:|--:|"
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(lookupProperty(depth0,"tried"),"hasError"),{"name":"if","hash":{},"fn":container.program(3, data, 0, blockParams, depths),"inverse":container.noop,"data":data,"loc":{"start":{"line":10,"column":21},"end":{"line":10,"column":54}}})) != null ? stack1 : "")
    + "--:|:--|\n"
    + ((stack1 = lookupProperty(helpers,"each").call(alias1,lookupProperty(lookupProperty(depth0,"tried"),"candidates"),{"name":"each","hash":{},"fn":container.program(4, data, 0, blockParams, depths),"inverse":container.noop,"data":data,"loc":{"start":{"line":11,"column":0},"end":{"line":13,"column":9}}})) != null ? stack1 : "");
},"2":function(container,depth0,helpers,partials,data) {
    return " error on rows held out |";
},"3":function(container,depth0,helpers,partials,data) {
    return "--:|";
},"4":function(container,depth0,helpers,partials,data,blockParams,depths) {
    var stack1, helper, alias1=container.strict, alias2=depth0 != null ? depth0 : (container.nullContext || {}), alias3="function", lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "| "
    + ((stack1 = (((helper = lookupProperty(helpers,"rank") || alias1(depth0, "rank", {"start":{"line":12,"column":4},"end":{"line":12,"column":8}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"rank","hash":{},"data":data,"loc":{"start":{"line":12,"column":2},"end":{"line":12,"column":10}}}) : helper))) != null ? stack1 : "")
    + " | "
    + ((stack1 = lookupProperty(helpers,"if").call(alias2,lookupProperty(depth0,"chosen"),{"name":"if","hash":{},"fn":container.program(5, data, 0, blockParams, depths),"inverse":container.program(6, data, 0, blockParams, depths),"data":data,"loc":{"start":{"line":12,"column":13},"end":{"line":12,"column":62}}})) != null ? stack1 : "")
    + " | "
    + ((stack1 = (((helper = lookupProperty(helpers,"coefficients") || alias1(depth0, "coefficients", {"start":{"line":12,"column":67},"end":{"line":12,"column":79}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"coefficients","hash":{},"data":data,"loc":{"start":{"line":12,"column":65},"end":{"line":12,"column":81}}}) : helper))) != null ? stack1 : "")
    + " | "
    + ((stack1 = (((helper = lookupProperty(helpers,"value") || alias1(depth0, "value", {"start":{"line":12,"column":86},"end":{"line":12,"column":91}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"value","hash":{},"data":data,"loc":{"start":{"line":12,"column":84},"end":{"line":12,"column":93}}}) : helper))) != null ? stack1 : "")
    + " | "
    + ((stack1 = (((helper = lookupProperty(helpers,"difference") || alias1(depth0, "difference", {"start":{"line":12,"column":98},"end":{"line":12,"column":108}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"difference","hash":{},"data":data,"loc":{"start":{"line":12,"column":96},"end":{"line":12,"column":110}}}) : helper))) != null ? stack1 : "")
    + " |"
    + ((stack1 = lookupProperty(helpers,"if").call(alias2,lookupProperty(lookupProperty(depths[1],"tried"),"hasError"),{"name":"if","hash":{},"fn":container.program(7, data, 0, blockParams, depths),"inverse":container.noop,"data":data,"loc":{"start":{"line":12,"column":112},"end":{"line":12,"column":156}}})) != null ? stack1 : "")
    + " "
    + ((stack1 = (((helper = lookupProperty(helpers,"adjustedRSquared") || alias1(depth0, "adjustedRSquared", {"start":{"line":12,"column":159},"end":{"line":12,"column":175}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"adjustedRSquared","hash":{},"data":data,"loc":{"start":{"line":12,"column":157},"end":{"line":12,"column":177}}}) : helper))) != null ? stack1 : "")
    + " | "
    + ((stack1 = (((helper = lookupProperty(helpers,"verdict") || alias1(depth0, "verdict", {"start":{"line":12,"column":182},"end":{"line":12,"column":189}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"verdict","hash":{},"data":data,"loc":{"start":{"line":12,"column":180},"end":{"line":12,"column":191}}}) : helper))) != null ? stack1 : "")
    + " |\n";
},"5":function(container,depth0,helpers,partials,data) {
    var stack1, helper, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "**"
    + ((stack1 = (((helper = lookupProperty(helpers,"name") || container.strict(depth0, "name", {"start":{"line":12,"column":31},"end":{"line":12,"column":35}} ))),(typeof helper === "function" ? helper.call(depth0 != null ? depth0 : (container.nullContext || {}),{"name":"name","hash":{},"data":data,"loc":{"start":{"line":12,"column":29},"end":{"line":12,"column":37}}}) : helper))) != null ? stack1 : "")
    + "**";
},"6":function(container,depth0,helpers,partials,data) {
    var stack1, helper, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = (((helper = lookupProperty(helpers,"name") || container.strict(depth0, "name", {"start":{"line":12,"column":49},"end":{"line":12,"column":53}} ))),(typeof helper === "function" ? helper.call(depth0 != null ? depth0 : (container.nullContext || {}),{"name":"name","hash":{},"data":data,"loc":{"start":{"line":12,"column":47},"end":{"line":12,"column":55}}}) : helper))) != null ? stack1 : "");
},"7":function(container,depth0,helpers,partials,data) {
    var stack1, helper, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return " "
    + ((stack1 = (((helper = lookupProperty(helpers,"error") || container.strict(depth0, "error", {"start":{"line":12,"column":140},"end":{"line":12,"column":145}} ))),(typeof helper === "function" ? helper.call(depth0 != null ? depth0 : (container.nullContext || {}),{"name":"error","hash":{},"data":data,"loc":{"start":{"line":12,"column":138},"end":{"line":12,"column":147}}}) : helper))) != null ? stack1 : "")
    + " |";
},"8":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "| rank | candidate | coefficients | adjusted R² | admitted? |\n|--:|:--|--:|--:|:--|\n"
    + ((stack1 = lookupProperty(helpers,"each").call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(lookupProperty(depth0,"tried"),"candidates"),{"name":"each","hash":{},"fn":container.program(9, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":17,"column":0},"end":{"line":19,"column":9}}})) != null ? stack1 : "");
},"9":function(container,depth0,helpers,partials,data) {
    var stack1, helper, alias1=container.strict, alias2=depth0 != null ? depth0 : (container.nullContext || {}), alias3="function", lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "| "
    + ((stack1 = (((helper = lookupProperty(helpers,"rank") || alias1(depth0, "rank", {"start":{"line":18,"column":4},"end":{"line":18,"column":8}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"rank","hash":{},"data":data,"loc":{"start":{"line":18,"column":2},"end":{"line":18,"column":10}}}) : helper))) != null ? stack1 : "")
    + " | "
    + ((stack1 = lookupProperty(helpers,"if").call(alias2,lookupProperty(depth0,"chosen"),{"name":"if","hash":{},"fn":container.program(5, data, 0),"inverse":container.program(6, data, 0),"data":data,"loc":{"start":{"line":18,"column":13},"end":{"line":18,"column":62}}})) != null ? stack1 : "")
    + " | "
    + ((stack1 = (((helper = lookupProperty(helpers,"coefficients") || alias1(depth0, "coefficients", {"start":{"line":18,"column":67},"end":{"line":18,"column":79}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"coefficients","hash":{},"data":data,"loc":{"start":{"line":18,"column":65},"end":{"line":18,"column":81}}}) : helper))) != null ? stack1 : "")
    + " | "
    + ((stack1 = (((helper = lookupProperty(helpers,"adjustedRSquared") || alias1(depth0, "adjustedRSquared", {"start":{"line":18,"column":86},"end":{"line":18,"column":102}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"adjustedRSquared","hash":{},"data":data,"loc":{"start":{"line":18,"column":84},"end":{"line":18,"column":104}}}) : helper))) != null ? stack1 : "")
    + " | "
    + ((stack1 = (((helper = lookupProperty(helpers,"verdict") || alias1(depth0, "verdict", {"start":{"line":18,"column":109},"end":{"line":18,"column":116}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"verdict","hash":{},"data":data,"loc":{"start":{"line":18,"column":107},"end":{"line":18,"column":118}}}) : helper))) != null ? stack1 : "")
    + " |\n";
},"10":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = container.lambda(container.strict(lookupProperty(depth0,"tried"), "candidatesMore", {"start":{"line":23,"column":2},"end":{"line":23,"column":22}} ), depth0)) != null ? stack1 : "")
    + "\n";
},"11":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = container.lambda(container.strict(lookupProperty(lookupProperty(depth0,"tried"),"stability"), "finding", {"start":{"line":26,"column":2},"end":{"line":26,"column":25}} ), depth0)) != null ? stack1 : "")
    + "\n";
},"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data,blockParams,depths) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "## What was tried?\n\n"
    + ((stack1 = lookupProperty(helpers,"each").call(alias1,lookupProperty(lookupProperty(depth0,"tried"),"rule"),{"name":"each","hash":{},"fn":container.program(0, data, 0, blockParams, depths),"inverse":container.noop,"data":data,"loc":{"start":{"line":3,"column":0},"end":{"line":5,"column":9}}})) != null ? stack1 : "")
    + ((stack1 = container.lambda(container.strict(lookupProperty(depth0,"tried"), "because", {"start":{"line":6,"column":2},"end":{"line":6,"column":15}} ), depth0)) != null ? stack1 : "")
    + "\n\n"
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(lookupProperty(depth0,"tried"),"ranked"),{"name":"if","hash":{},"fn":container.program(1, data, 0, blockParams, depths),"inverse":container.program(8, data, 0, blockParams, depths),"data":data,"loc":{"start":{"line":8,"column":0},"end":{"line":20,"column":7}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(lookupProperty(depth0,"tried"),"candidatesMore"),{"name":"if","hash":{},"fn":container.program(10, data, 0, blockParams, depths),"inverse":container.noop,"data":data,"loc":{"start":{"line":22,"column":0},"end":{"line":24,"column":7}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(lookupProperty(depth0,"tried"),"stability"),{"name":"if","hash":{},"fn":container.program(11, data, 0, blockParams, depths),"inverse":container.noop,"data":data,"loc":{"start":{"line":25,"column":0},"end":{"line":27,"column":7}}})) != null ? stack1 : "");
},"useData":true,"useDepths":true},
  'markdown-coefficients': {"0":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), alias2=container.strict, alias3=container.lambda, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "## What does it say?\n\n"
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(lookupProperty(depth0,"says"),"scaleNote"),{"name":"if","hash":{},"fn":container.program(1, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":4,"column":0},"end":{"line":7,"column":7}}})) != null ? stack1 : "")
    + "Coefficients for "
    + ((stack1 = alias3(alias2(lookupProperty(depth0,"says"), "quantity", {"start":{"line":8,"column":19},"end":{"line":8,"column":32}} ), depth0)) != null ? stack1 : "")
    + ":\n\n| coefficient | unit of its column | estimate | standard error | "
    + ((stack1 = alias3(alias2(lookupProperty(depth0,"says"), "confidence", {"start":{"line":10,"column":67},"end":{"line":10,"column":82}} ), depth0)) != null ? stack1 : "")
    + " interval | p-value |\n|:--|:--|--:|--:|--:|--:|\n"
    + ((stack1 = lookupProperty(helpers,"each").call(alias1,lookupProperty(lookupProperty(depth0,"says"),"coefficients"),{"name":"each","hash":{},"fn":container.program(2, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":12,"column":0},"end":{"line":14,"column":9}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(lookupProperty(depth0,"says"),"looked"),{"name":"if","hash":{},"fn":container.program(3, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":16,"column":0},"end":{"line":18,"column":7}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"each").call(alias1,lookupProperty(lookupProperty(depth0,"says"),"hypotheses"),{"name":"each","hash":{},"fn":container.program(4, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":19,"column":0},"end":{"line":21,"column":9}}})) != null ? stack1 : "");
},"1":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = container.lambda(container.strict(lookupProperty(depth0,"says"), "scaleNote", {"start":{"line":5,"column":2},"end":{"line":5,"column":16}} ), depth0)) != null ? stack1 : "")
    + "\n\n";
},"2":function(container,depth0,helpers,partials,data) {
    var stack1, helper, alias1=container.strict, alias2=depth0 != null ? depth0 : (container.nullContext || {}), alias3="function", lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "| "
    + ((stack1 = (((helper = lookupProperty(helpers,"name") || alias1(depth0, "name", {"start":{"line":13,"column":4},"end":{"line":13,"column":8}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":13,"column":2},"end":{"line":13,"column":10}}}) : helper))) != null ? stack1 : "")
    + " | "
    + ((stack1 = (((helper = lookupProperty(helpers,"unit") || alias1(depth0, "unit", {"start":{"line":13,"column":15},"end":{"line":13,"column":19}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"unit","hash":{},"data":data,"loc":{"start":{"line":13,"column":13},"end":{"line":13,"column":21}}}) : helper))) != null ? stack1 : "")
    + " | "
    + ((stack1 = (((helper = lookupProperty(helpers,"estimate") || alias1(depth0, "estimate", {"start":{"line":13,"column":26},"end":{"line":13,"column":34}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"estimate","hash":{},"data":data,"loc":{"start":{"line":13,"column":24},"end":{"line":13,"column":36}}}) : helper))) != null ? stack1 : "")
    + " | "
    + ((stack1 = (((helper = lookupProperty(helpers,"standardError") || alias1(depth0, "standardError", {"start":{"line":13,"column":41},"end":{"line":13,"column":54}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"standardError","hash":{},"data":data,"loc":{"start":{"line":13,"column":39},"end":{"line":13,"column":56}}}) : helper))) != null ? stack1 : "")
    + " | "
    + ((stack1 = (((helper = lookupProperty(helpers,"interval") || alias1(depth0, "interval", {"start":{"line":13,"column":61},"end":{"line":13,"column":69}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"interval","hash":{},"data":data,"loc":{"start":{"line":13,"column":59},"end":{"line":13,"column":71}}}) : helper))) != null ? stack1 : "")
    + " | "
    + ((stack1 = (((helper = lookupProperty(helpers,"pValue") || alias1(depth0, "pValue", {"start":{"line":13,"column":76},"end":{"line":13,"column":82}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"pValue","hash":{},"data":data,"loc":{"start":{"line":13,"column":74},"end":{"line":13,"column":84}}}) : helper))) != null ? stack1 : "")
    + " |\n";
},"3":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = container.lambda(container.strict(lookupProperty(depth0,"says"), "looked", {"start":{"line":17,"column":2},"end":{"line":17,"column":13}} ), depth0)) != null ? stack1 : "")
    + "\n";
},"4":function(container,depth0,helpers,partials,data) {
    var stack1, helper, alias1=container.strict, alias2=depth0 != null ? depth0 : (container.nullContext || {}), alias3="function", lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "- **"
    + ((stack1 = (((helper = lookupProperty(helpers,"name") || alias1(depth0, "name", {"start":{"line":20,"column":6},"end":{"line":20,"column":10}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":20,"column":4},"end":{"line":20,"column":12}}}) : helper))) != null ? stack1 : "")
    + "?** "
    + ((stack1 = (((helper = lookupProperty(helpers,"verdict") || alias1(depth0, "verdict", {"start":{"line":20,"column":18},"end":{"line":20,"column":25}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"verdict","hash":{},"data":data,"loc":{"start":{"line":20,"column":16},"end":{"line":20,"column":27}}}) : helper))) != null ? stack1 : "")
    + "\n";
},"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(depth0,"says"),{"name":"if","hash":{},"fn":container.program(0, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":1,"column":0},"end":{"line":22,"column":7}}})) != null ? stack1 : "");
},"useData":true},
  'markdown-first-screen': {"0":function(container,depth0,helpers,partials,data) {
    var stack1, helper, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "*"
    + ((stack1 = (((helper = lookupProperty(helpers,"question") || container.strict(depth0, "question", {"start":{"line":4,"column":3},"end":{"line":4,"column":11}} ))),(typeof helper === "function" ? helper.call(depth0 != null ? depth0 : (container.nullContext || {}),{"name":"question","hash":{},"data":data,"loc":{"start":{"line":4,"column":1},"end":{"line":4,"column":13}}}) : helper))) != null ? stack1 : "")
    + "*\n\n";
},"1":function(container,depth0,helpers,partials,data) {
    var stack1;

  return ((stack1 = container.lambda(depth0, depth0)) != null ? stack1 : "")
    + "\n\n";
},"2":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = container.lambda(container.strict(lookupProperty(depth0,"head"), "fit", {"start":{"line":12,"column":2},"end":{"line":12,"column":10}} ), depth0)) != null ? stack1 : "")
    + "\n\n";
},"3":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "| row | estimate | "
    + ((stack1 = container.lambda(container.strict(lookupProperty(depth0,"head"), "predictionConfidence", {"start":{"line":16,"column":21},"end":{"line":16,"column":46}} ), depth0)) != null ? stack1 : "")
    + " interval for a new row |\n|:--|--:|--:|\n"
    + ((stack1 = lookupProperty(helpers,"each").call(alias1,lookupProperty(lookupProperty(depth0,"head"),"predictions"),{"name":"each","hash":{},"fn":container.program(4, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":18,"column":0},"end":{"line":20,"column":9}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(lookupProperty(depth0,"head"),"predictionsMore"),{"name":"if","hash":{},"fn":container.program(8, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":22,"column":0},"end":{"line":25,"column":7}}})) != null ? stack1 : "");
},"4":function(container,depth0,helpers,partials,data) {
    var stack1, helper, alias1=depth0 != null ? depth0 : (container.nullContext || {}), alias2=container.strict, alias3="function", lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "| "
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(depth0,"total"),{"name":"if","hash":{},"fn":container.program(5, data, 0),"inverse":container.program(6, data, 0),"data":data,"loc":{"start":{"line":19,"column":2},"end":{"line":19,"column":52}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(depth0,"outside"),{"name":"if","hash":{},"fn":container.program(7, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":19,"column":52},"end":{"line":19,"column":93}}})) != null ? stack1 : "")
    + " | "
    + ((stack1 = (((helper = lookupProperty(helpers,"estimate") || alias2(depth0, "estimate", {"start":{"line":19,"column":98},"end":{"line":19,"column":106}} ))),(typeof helper === alias3 ? helper.call(alias1,{"name":"estimate","hash":{},"data":data,"loc":{"start":{"line":19,"column":96},"end":{"line":19,"column":108}}}) : helper))) != null ? stack1 : "")
    + " | "
    + ((stack1 = (((helper = lookupProperty(helpers,"interval") || alias2(depth0, "interval", {"start":{"line":19,"column":113},"end":{"line":19,"column":121}} ))),(typeof helper === alias3 ? helper.call(alias1,{"name":"interval","hash":{},"data":data,"loc":{"start":{"line":19,"column":111},"end":{"line":19,"column":123}}}) : helper))) != null ? stack1 : "")
    + " |\n";
},"5":function(container,depth0,helpers,partials,data) {
    var stack1, helper, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "**"
    + ((stack1 = (((helper = lookupProperty(helpers,"label") || container.strict(depth0, "label", {"start":{"line":19,"column":19},"end":{"line":19,"column":24}} ))),(typeof helper === "function" ? helper.call(depth0 != null ? depth0 : (container.nullContext || {}),{"name":"label","hash":{},"data":data,"loc":{"start":{"line":19,"column":17},"end":{"line":19,"column":26}}}) : helper))) != null ? stack1 : "")
    + "**";
},"6":function(container,depth0,helpers,partials,data) {
    var stack1, helper, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = (((helper = lookupProperty(helpers,"label") || container.strict(depth0, "label", {"start":{"line":19,"column":38},"end":{"line":19,"column":43}} ))),(typeof helper === "function" ? helper.call(depth0 != null ? depth0 : (container.nullContext || {}),{"name":"label","hash":{},"data":data,"loc":{"start":{"line":19,"column":36},"end":{"line":19,"column":45}}}) : helper))) != null ? stack1 : "");
},"7":function(container,depth0,helpers,partials,data) {
    return " (outside the data)";
},"8":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = container.lambda(container.strict(lookupProperty(depth0,"head"), "predictionsMore", {"start":{"line":23,"column":2},"end":{"line":23,"column":22}} ), depth0)) != null ? stack1 : "")
    + "\n\n";
},"9":function(container,depth0,helpers,partials,data) {
    var stack1;

  return "1. "
    + ((stack1 = container.lambda(depth0, depth0)) != null ? stack1 : "")
    + "\n";
},"10":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "**"
    + ((stack1 = container.lambda(container.strict(lookupProperty(depth0,"head"), "acceptance", {"start":{"line":34,"column":4},"end":{"line":34,"column":19}} ), depth0)) != null ? stack1 : "")
    + "**\n\n"
    + ((stack1 = lookupProperty(helpers,"each").call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(lookupProperty(depth0,"head"),"criteria"),{"name":"each","hash":{},"fn":container.program(11, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":36,"column":0},"end":{"line":38,"column":9}}})) != null ? stack1 : "");
},"11":function(container,depth0,helpers,partials,data) {
    var stack1, helper, alias1=container.strict, alias2=depth0 != null ? depth0 : (container.nullContext || {}), alias3="function", lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "- "
    + ((stack1 = (((helper = lookupProperty(helpers,"word") || alias1(depth0, "word", {"start":{"line":37,"column":4},"end":{"line":37,"column":8}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"word","hash":{},"data":data,"loc":{"start":{"line":37,"column":2},"end":{"line":37,"column":10}}}) : helper))) != null ? stack1 : "")
    + ": "
    + ((stack1 = (((helper = lookupProperty(helpers,"name") || alias1(depth0, "name", {"start":{"line":37,"column":14},"end":{"line":37,"column":18}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":37,"column":12},"end":{"line":37,"column":20}}}) : helper))) != null ? stack1 : "")
    + " "
    + ((stack1 = (((helper = lookupProperty(helpers,"value") || alias1(depth0, "value", {"start":{"line":37,"column":23},"end":{"line":37,"column":28}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"value","hash":{},"data":data,"loc":{"start":{"line":37,"column":21},"end":{"line":37,"column":30}}}) : helper))) != null ? stack1 : "")
    + "; asked for: "
    + ((stack1 = (((helper = lookupProperty(helpers,"limit") || alias1(depth0, "limit", {"start":{"line":37,"column":45},"end":{"line":37,"column":50}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"limit","hash":{},"data":data,"loc":{"start":{"line":37,"column":43},"end":{"line":37,"column":52}}}) : helper))) != null ? stack1 : "")
    + "\n";
},"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, helper, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "# "
    + ((stack1 = (((helper = lookupProperty(helpers,"title") || container.strict(depth0, "title", {"start":{"line":1,"column":4},"end":{"line":1,"column":9}} ))),(typeof helper === "function" ? helper.call(alias1,{"name":"title","hash":{},"data":data,"loc":{"start":{"line":1,"column":2},"end":{"line":1,"column":11}}}) : helper))) != null ? stack1 : "")
    + "\n\n"
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(depth0,"question"),{"name":"if","hash":{},"fn":container.program(0, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":3,"column":0},"end":{"line":6,"column":7}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"each").call(alias1,lookupProperty(lookupProperty(depth0,"head"),"answer"),{"name":"each","hash":{},"fn":container.program(1, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":7,"column":0},"end":{"line":10,"column":9}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(lookupProperty(depth0,"head"),"fit"),{"name":"if","hash":{},"fn":container.program(2, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":11,"column":0},"end":{"line":14,"column":7}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(lookupProperty(depth0,"head"),"predictions"),{"name":"if","hash":{},"fn":container.program(3, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":15,"column":0},"end":{"line":26,"column":7}}})) != null ? stack1 : "")
    + "**Before you rely on this**\n\n"
    + ((stack1 = lookupProperty(helpers,"each").call(alias1,lookupProperty(lookupProperty(depth0,"head"),"beware"),{"name":"each","hash":{},"fn":container.program(9, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":29,"column":0},"end":{"line":31,"column":9}}})) != null ? stack1 : "")
    + "\n"
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(lookupProperty(depth0,"head"),"acceptance"),{"name":"if","hash":{},"fn":container.program(10, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":33,"column":0},"end":{"line":39,"column":7}}})) != null ? stack1 : "");
},"useData":true},
  'markdown-trust': {"0":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "## Can it be trusted?\n\n"
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(lookupProperty(depth0,"trust"),"unseen"),{"name":"if","hash":{},"fn":container.program(1, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":4,"column":0},"end":{"line":7,"column":7}}})) != null ? stack1 : "")
    + ((stack1 = container.lambda(container.strict(lookupProperty(depth0,"trust"), "summary", {"start":{"line":8,"column":2},"end":{"line":8,"column":15}} ), depth0)) != null ? stack1 : "")
    + "\n\n"
    + ((stack1 = lookupProperty(helpers,"each").call(alias1,lookupProperty(lookupProperty(depth0,"trust"),"findings"),{"name":"each","hash":{},"fn":container.program(2, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":10,"column":0},"end":{"line":12,"column":9}}})) != null ? stack1 : "");
},"1":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = container.lambda(container.strict(lookupProperty(lookupProperty(depth0,"trust"),"unseen"), "finding", {"start":{"line":5,"column":2},"end":{"line":5,"column":22}} ), depth0)) != null ? stack1 : "")
    + "\n\n";
},"2":function(container,depth0,helpers,partials,data) {
    var stack1, helper, alias1=container.strict, alias2=depth0 != null ? depth0 : (container.nullContext || {}), alias3="function", lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "- **"
    + ((stack1 = (((helper = lookupProperty(helpers,"question") || alias1(depth0, "question", {"start":{"line":11,"column":6},"end":{"line":11,"column":14}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"question","hash":{},"data":data,"loc":{"start":{"line":11,"column":4},"end":{"line":11,"column":16}}}) : helper))) != null ? stack1 : "")
    + "** "
    + ((stack1 = (((helper = lookupProperty(helpers,"word") || alias1(depth0, "word", {"start":{"line":11,"column":21},"end":{"line":11,"column":25}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"word","hash":{},"data":data,"loc":{"start":{"line":11,"column":19},"end":{"line":11,"column":27}}}) : helper))) != null ? stack1 : "")
    + ". "
    + ((stack1 = (((helper = lookupProperty(helpers,"verdict") || alias1(depth0, "verdict", {"start":{"line":11,"column":31},"end":{"line":11,"column":38}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"verdict","hash":{},"data":data,"loc":{"start":{"line":11,"column":29},"end":{"line":11,"column":40}}}) : helper))) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias2,lookupProperty(depth0,"advice"),{"name":"if","hash":{},"fn":container.program(3, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":11,"column":40},"end":{"line":11,"column":72}}})) != null ? stack1 : "")
    + "\n";
},"3":function(container,depth0,helpers,partials,data) {
    var stack1, helper, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return " "
    + ((stack1 = (((helper = lookupProperty(helpers,"advice") || container.strict(depth0, "advice", {"start":{"line":11,"column":57},"end":{"line":11,"column":63}} ))),(typeof helper === "function" ? helper.call(depth0 != null ? depth0 : (container.nullContext || {}),{"name":"advice","hash":{},"data":data,"loc":{"start":{"line":11,"column":55},"end":{"line":11,"column":65}}}) : helper))) != null ? stack1 : "");
},"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(depth0,"trust"),{"name":"if","hash":{},"fn":container.program(0, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":1,"column":0},"end":{"line":13,"column":7}}})) != null ? stack1 : "");
},"useData":true},
  'predicts': {"0":function(container,depth0,helpers,partials,data,blockParams,depths) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(lookupProperty(depth0,"predicts"),"chart"),{"name":"if","hash":{},"fn":container.program(1, data, 0, blockParams, depths),"inverse":container.noop,"data":data,"loc":{"start":{"line":4,"column":0},"end":{"line":6,"column":7}}})) != null ? stack1 : "")
    + "<div class=\"scroll long\" tabindex=\"0\" role=\"region\" aria-label=\"Predictions\">\n<table>\n<caption>Predictions with "
    + container.escapeExpression(container.lambda(container.strict(lookupProperty(depth0,"predicts"), "confidence", {"start":{"line":9,"column":28},"end":{"line":9,"column":47}} ), depth0))
    + " intervals</caption>\n<thead><tr><th scope=\"col\">row and its values</th><th scope=\"col\" class=\"n\">estimate</th>"
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(lookupProperty(depth0,"predicts"),"hasMean"),{"name":"if","hash":{},"fn":container.program(2, data, 0, blockParams, depths),"inverse":container.noop,"data":data,"loc":{"start":{"line":10,"column":89},"end":{"line":10,"column":155}}})) != null ? stack1 : "")
    + "<th scope=\"col\" class=\"n\">interval for a new row</th>"
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(lookupProperty(depth0,"predicts"),"hasDrawn"),{"name":"if","hash":{},"fn":container.program(3, data, 0, blockParams, depths),"inverse":container.noop,"data":data,"loc":{"start":{"line":10,"column":208},"end":{"line":10,"column":300}}})) != null ? stack1 : "")
    + "<th scope=\"col\" class=\"n\">interval for the mean</th><th scope=\"col\">inside the data?</th></tr></thead>\n<tbody>\n"
    + ((stack1 = lookupProperty(helpers,"each").call(alias1,lookupProperty(lookupProperty(depth0,"predicts"),"rows"),{"name":"each","hash":{},"fn":container.program(4, data, 0, blockParams, depths),"inverse":container.noop,"data":data,"loc":{"start":{"line":12,"column":0},"end":{"line":14,"column":9}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(lookupProperty(depth0,"predicts"),"total"),{"name":"if","hash":{},"fn":container.program(7, data, 0, blockParams, depths),"inverse":container.noop,"data":data,"loc":{"start":{"line":15,"column":0},"end":{"line":17,"column":7}}})) != null ? stack1 : "")
    + "</tbody>\n</table>\n</div>\n"
    + ((stack1 = lookupProperty(helpers,"each").call(alias1,lookupProperty(lookupProperty(depth0,"predicts"),"notes"),{"name":"each","hash":{},"fn":container.program(11, data, 0, blockParams, depths),"inverse":container.noop,"data":data,"loc":{"start":{"line":21,"column":0},"end":{"line":23,"column":9}}})) != null ? stack1 : "");
},"1":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = container.invokePartial(lookupProperty(partials,"figure"),lookupProperty(lookupProperty(depth0,"predicts"),"chart"),{"name":"figure","data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "");
},"2":function(container,depth0,helpers,partials,data) {
    return "<th scope=\"col\" class=\"n\">mean</th>";
},"3":function(container,depth0,helpers,partials,data) {
    return "<th scope=\"col\" class=\"n\">the same, drawn from the rows</th>";
},"4":function(container,depth0,helpers,partials,data,blockParams,depths) {
    var stack1, helper, alias1=container.strict, alias2=depth0 != null ? depth0 : (container.nullContext || {}), alias3="function", alias4=container.escapeExpression, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<tr><th scope=\"row\">"
    + alias4((((helper = lookupProperty(helpers,"label") || alias1(depth0, "label", {"start":{"line":13,"column":22},"end":{"line":13,"column":27}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"label","hash":{},"data":data,"loc":{"start":{"line":13,"column":20},"end":{"line":13,"column":29}}}) : helper)))
    + "<span class=\"under\">"
    + alias4((((helper = lookupProperty(helpers,"values") || alias1(depth0, "values", {"start":{"line":13,"column":51},"end":{"line":13,"column":57}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"values","hash":{},"data":data,"loc":{"start":{"line":13,"column":49},"end":{"line":13,"column":59}}}) : helper)))
    + "</span></th><td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"estimate") || alias1(depth0, "estimate", {"start":{"line":13,"column":87},"end":{"line":13,"column":95}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"estimate","hash":{},"data":data,"loc":{"start":{"line":13,"column":85},"end":{"line":13,"column":97}}}) : helper)))
    + "</td>"
    + ((stack1 = lookupProperty(helpers,"if").call(alias2,lookupProperty(lookupProperty(depths[1],"predicts"),"hasMean"),{"name":"if","hash":{},"fn":container.program(5, data, 0, blockParams, depths),"inverse":container.noop,"data":data,"loc":{"start":{"line":13,"column":102},"end":{"line":13,"column":163}}})) != null ? stack1 : "")
    + "<td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"newInterval") || alias1(depth0, "newInterval", {"start":{"line":13,"column":179},"end":{"line":13,"column":190}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"newInterval","hash":{},"data":data,"loc":{"start":{"line":13,"column":177},"end":{"line":13,"column":192}}}) : helper)))
    + "</td>"
    + ((stack1 = lookupProperty(helpers,"if").call(alias2,lookupProperty(lookupProperty(depths[1],"predicts"),"hasDrawn"),{"name":"if","hash":{},"fn":container.program(6, data, 0, blockParams, depths),"inverse":container.noop,"data":data,"loc":{"start":{"line":13,"column":197},"end":{"line":13,"column":268}}})) != null ? stack1 : "")
    + "<td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"meanInterval") || alias1(depth0, "meanInterval", {"start":{"line":13,"column":284},"end":{"line":13,"column":296}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"meanInterval","hash":{},"data":data,"loc":{"start":{"line":13,"column":282},"end":{"line":13,"column":298}}}) : helper)))
    + "</td><td class=\"wide\">"
    + alias4((((helper = lookupProperty(helpers,"place") || alias1(depth0, "place", {"start":{"line":13,"column":322},"end":{"line":13,"column":327}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"place","hash":{},"data":data,"loc":{"start":{"line":13,"column":320},"end":{"line":13,"column":329}}}) : helper)))
    + "</td></tr>\n";
},"5":function(container,depth0,helpers,partials,data) {
    var helper, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<td class=\"n\">"
    + container.escapeExpression((((helper = lookupProperty(helpers,"mean") || container.strict(depth0, "mean", {"start":{"line":13,"column":145},"end":{"line":13,"column":149}} ))),(typeof helper === "function" ? helper.call(depth0 != null ? depth0 : (container.nullContext || {}),{"name":"mean","hash":{},"data":data,"loc":{"start":{"line":13,"column":143},"end":{"line":13,"column":151}}}) : helper)))
    + "</td>";
},"6":function(container,depth0,helpers,partials,data) {
    var helper, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<td class=\"n\">"
    + container.escapeExpression((((helper = lookupProperty(helpers,"drawnInterval") || container.strict(depth0, "drawnInterval", {"start":{"line":13,"column":241},"end":{"line":13,"column":254}} ))),(typeof helper === "function" ? helper.call(depth0 != null ? depth0 : (container.nullContext || {}),{"name":"drawnInterval","hash":{},"data":data,"loc":{"start":{"line":13,"column":239},"end":{"line":13,"column":256}}}) : helper)))
    + "</td>";
},"7":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=container.strict, alias2=container.lambda, alias3=container.escapeExpression, alias4=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<tr class=\"total\"><th scope=\"row\">Total of "
    + alias3(alias2(alias1(lookupProperty(lookupProperty(depth0,"predicts"),"total"), "rows", {"start":{"line":16,"column":45},"end":{"line":16,"column":64}} ), depth0))
    + " rows</th><td class=\"n\">"
    + alias3(alias2(alias1(lookupProperty(lookupProperty(depth0,"predicts"),"total"), "estimate", {"start":{"line":16,"column":92},"end":{"line":16,"column":115}} ), depth0))
    + "</td>"
    + ((stack1 = lookupProperty(helpers,"if").call(alias4,lookupProperty(lookupProperty(depth0,"predicts"),"hasMean"),{"name":"if","hash":{},"fn":container.program(8, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":16,"column":122},"end":{"line":16,"column":229}}})) != null ? stack1 : "")
    + "<td class=\"n\">"
    + alias3(alias2(alias1(lookupProperty(lookupProperty(depth0,"predicts"),"total"), "interval", {"start":{"line":16,"column":245},"end":{"line":16,"column":268}} ), depth0))
    + "</td>"
    + ((stack1 = lookupProperty(helpers,"if").call(alias4,lookupProperty(lookupProperty(depth0,"predicts"),"hasDrawn"),{"name":"if","hash":{},"fn":container.program(10, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":16,"column":275},"end":{"line":16,"column":327}}})) != null ? stack1 : "")
    + "<td class=\"n\">–</td><td></td></tr>\n";
},"8":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<td class=\"n\">"
    + ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(lookupProperty(lookupProperty(depth0,"predicts"),"total"),"mean"),{"name":"if","hash":{},"fn":container.program(9, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":16,"column":160},"end":{"line":16,"column":217}}})) != null ? stack1 : "")
    + "</td>";
},"9":function(container,depth0,helpers,partials,data) {
    var lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return container.escapeExpression(container.lambda(container.strict(lookupProperty(lookupProperty(depth0,"predicts"),"total"), "mean", {"start":{"line":16,"column":189},"end":{"line":16,"column":208}} ), depth0));
},"10":function(container,depth0,helpers,partials,data) {
    return "<td class=\"n\">–</td>";
},"11":function(container,depth0,helpers,partials,data) {
    return "<p class=\"small\">"
    + container.escapeExpression(container.lambda(depth0, depth0))
    + "</p>\n";
},"12":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(depth0,"hasModel"),{"name":"if","hash":{},"fn":container.program(13, data, 0),"inverse":container.program(14, data, 0),"data":data,"loc":{"start":{"line":25,"column":0},"end":{"line":29,"column":7}}})) != null ? stack1 : "");
},"13":function(container,depth0,helpers,partials,data) {
    return "<p>No prediction was asked for.</p>\n";
},"14":function(container,depth0,helpers,partials,data) {
    return "<p>Without an admitted model nothing is predicted.</p>\n";
},"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data,blockParams,depths) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<section id=\"predicts\" aria-labelledby=\"predicts-heading\">\n<h2 id=\"predicts-heading\"><span class=\"no\">5</span> What does it predict?</h2>\n"
    + ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(depth0,"predicts"),{"name":"if","hash":{},"fn":container.program(0, data, 0, blockParams, depths),"inverse":container.program(12, data, 0, blockParams, depths),"data":data,"loc":{"start":{"line":3,"column":0},"end":{"line":30,"column":7}}})) != null ? stack1 : "")
    + "</section>\n";
},"usePartial":true,"useData":true,"useDepths":true},
  'says': {"0":function(container,depth0,helpers,partials,data,blockParams,depths) {
    var stack1, alias1=container.strict, alias2=container.lambda, alias3=container.escapeExpression, alias4=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<p>"
    + alias3(alias2(alias1(lookupProperty(depth0,"says"), "fit", {"start":{"line":4,"column":5},"end":{"line":4,"column":13}} ), depth0))
    + "</p>\n"
    + ((stack1 = lookupProperty(helpers,"if").call(alias4,lookupProperty(lookupProperty(depth0,"says"),"scaleNote"),{"name":"if","hash":{},"fn":container.program(1, data, 0, blockParams, depths),"inverse":container.noop,"data":data,"loc":{"start":{"line":5,"column":0},"end":{"line":7,"column":7}}})) != null ? stack1 : "")
    + "<div class=\"equation\" role=\"group\" aria-label=\"The equation\">\n<div class=\"left\">"
    + alias3(alias2(alias1(lookupProperty(lookupProperty(depth0,"says"),"equation"), "left", {"start":{"line":9,"column":20},"end":{"line":9,"column":38}} ), depth0))
    + " =</div>\n<ul>\n"
    + ((stack1 = lookupProperty(helpers,"each").call(alias4,lookupProperty(lookupProperty(lookupProperty(depth0,"says"),"equation"),"summands"),{"name":"each","hash":{},"fn":container.program(2, data, 0, blockParams, depths),"inverse":container.noop,"data":data,"loc":{"start":{"line":11,"column":0},"end":{"line":13,"column":9}}})) != null ? stack1 : "")
    + "</ul>\n</div>\n<p class=\"small\">"
    + ((stack1 = lookupProperty(helpers,"if").call(alias4,lookupProperty(lookupProperty(lookupProperty(depth0,"says"),"equation"),"note"),{"name":"if","hash":{},"fn":container.program(4, data, 0, blockParams, depths),"inverse":container.noop,"data":data,"loc":{"start":{"line":16,"column":17},"end":{"line":16,"column":73}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias4,lookupProperty(lookupProperty(depth0,"says"),"overall"),{"name":"if","hash":{},"fn":container.program(5, data, 0, blockParams, depths),"inverse":container.noop,"data":data,"loc":{"start":{"line":16,"column":73},"end":{"line":16,"column":116}}})) != null ? stack1 : "")
    + "</p>\n"
    + ((stack1 = lookupProperty(helpers,"if").call(alias4,lookupProperty(lookupProperty(depth0,"says"),"ladder"),{"name":"if","hash":{},"fn":container.program(6, data, 0, blockParams, depths),"inverse":container.noop,"data":data,"loc":{"start":{"line":17,"column":0},"end":{"line":21,"column":7}}})) != null ? stack1 : "")
    + "<h3>Term by term</h3>\n"
    + ((stack1 = lookupProperty(helpers,"each").call(alias4,lookupProperty(lookupProperty(depth0,"says"),"terms"),{"name":"each","hash":{},"fn":container.program(7, data, 0, blockParams, depths),"inverse":container.noop,"data":data,"loc":{"start":{"line":23,"column":0},"end":{"line":54,"column":9}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias4,lookupProperty(lookupProperty(depth0,"says"),"hypotheses"),{"name":"if","hash":{},"fn":container.program(15, data, 0, blockParams, depths),"inverse":container.noop,"data":data,"loc":{"start":{"line":55,"column":0},"end":{"line":63,"column":7}}})) != null ? stack1 : "")
    + "<h3>All coefficients</h3>\n"
    + ((stack1 = lookupProperty(helpers,"if").call(alias4,lookupProperty(lookupProperty(depth0,"says"),"errors"),{"name":"if","hash":{},"fn":container.program(17, data, 0, blockParams, depths),"inverse":container.noop,"data":data,"loc":{"start":{"line":65,"column":0},"end":{"line":67,"column":7}}})) != null ? stack1 : "")
    + "<div class=\"scroll\" tabindex=\"0\" role=\"region\" aria-label=\"Coefficients\">\n<table>\n<caption>Coefficients for "
    + alias3(alias2(alias1(lookupProperty(depth0,"says"), "quantity", {"start":{"line":70,"column":28},"end":{"line":70,"column":41}} ), depth0))
    + "; the p-value compares each with zero, the other terms held</caption>\n<thead><tr><th scope=\"col\">coefficient</th><th scope=\"col\">unit of its column</th><th scope=\"col\" class=\"n\">estimate</th><th scope=\"col\" class=\"n\">standard error</th><th scope=\"col\" class=\"n\">"
    + alias3(alias2(alias1(lookupProperty(depth0,"says"), "confidence", {"start":{"line":71,"column":194},"end":{"line":71,"column":209}} ), depth0))
    + " interval</th><th scope=\"col\" class=\"n\">p-value</th><th scope=\"col\" class=\"n\">variance inflation</th></tr></thead>\n<tbody>\n"
    + ((stack1 = lookupProperty(helpers,"each").call(alias4,lookupProperty(lookupProperty(depth0,"says"),"coefficients"),{"name":"each","hash":{},"fn":container.program(18, data, 0, blockParams, depths),"inverse":container.noop,"data":data,"loc":{"start":{"line":73,"column":0},"end":{"line":75,"column":9}}})) != null ? stack1 : "")
    + "</tbody>\n</table>\n</div>\n"
    + ((stack1 = lookupProperty(helpers,"if").call(alias4,lookupProperty(lookupProperty(depth0,"says"),"looked"),{"name":"if","hash":{},"fn":container.program(19, data, 0, blockParams, depths),"inverse":container.noop,"data":data,"loc":{"start":{"line":79,"column":0},"end":{"line":81,"column":7}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias4,lookupProperty(lookupProperty(depth0,"says"),"more"),{"name":"if","hash":{},"fn":container.program(20, data, 0, blockParams, depths),"inverse":container.noop,"data":data,"loc":{"start":{"line":82,"column":0},"end":{"line":97,"column":7}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias4,lookupProperty(lookupProperty(depth0,"says"),"averaged"),{"name":"if","hash":{},"fn":container.program(27, data, 0, blockParams, depths),"inverse":container.noop,"data":data,"loc":{"start":{"line":98,"column":0},"end":{"line":127,"column":7}}})) != null ? stack1 : "");
},"1":function(container,depth0,helpers,partials,data) {
    var lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<p>"
    + container.escapeExpression(container.lambda(container.strict(lookupProperty(depth0,"says"), "scaleNote", {"start":{"line":6,"column":5},"end":{"line":6,"column":19}} ), depth0))
    + "</p>\n";
},"2":function(container,depth0,helpers,partials,data) {
    var stack1, helper, alias1=container.strict, alias2=depth0 != null ? depth0 : (container.nullContext || {}), alias3="function", alias4=container.escapeExpression, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<li><span class=\"sign\">"
    + alias4((((helper = lookupProperty(helpers,"sign") || alias1(depth0, "sign", {"start":{"line":12,"column":25},"end":{"line":12,"column":29}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"sign","hash":{},"data":data,"loc":{"start":{"line":12,"column":23},"end":{"line":12,"column":31}}}) : helper)))
    + "</span> <span class=\"num\">"
    + alias4((((helper = lookupProperty(helpers,"number") || alias1(depth0, "number", {"start":{"line":12,"column":59},"end":{"line":12,"column":65}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"number","hash":{},"data":data,"loc":{"start":{"line":12,"column":57},"end":{"line":12,"column":67}}}) : helper)))
    + "</span>"
    + ((stack1 = lookupProperty(helpers,"if").call(alias2,lookupProperty(depth0,"factor"),{"name":"if","hash":{},"fn":container.program(3, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":12,"column":74},"end":{"line":12,"column":136}}})) != null ? stack1 : "")
    + "</li>\n";
},"3":function(container,depth0,helpers,partials,data) {
    var helper, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return " <span class=\"factor\">× "
    + container.escapeExpression((((helper = lookupProperty(helpers,"factor") || container.strict(depth0, "factor", {"start":{"line":12,"column":114},"end":{"line":12,"column":120}} ))),(typeof helper === "function" ? helper.call(depth0 != null ? depth0 : (container.nullContext || {}),{"name":"factor","hash":{},"data":data,"loc":{"start":{"line":12,"column":112},"end":{"line":12,"column":122}}}) : helper)))
    + "</span>";
},"4":function(container,depth0,helpers,partials,data) {
    var lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return container.escapeExpression(container.lambda(container.strict(lookupProperty(lookupProperty(depth0,"says"),"equation"), "note", {"start":{"line":16,"column":45},"end":{"line":16,"column":63}} ), depth0))
    + " ";
},"5":function(container,depth0,helpers,partials,data) {
    var lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return container.escapeExpression(container.lambda(container.strict(lookupProperty(depth0,"says"), "overall", {"start":{"line":16,"column":95},"end":{"line":16,"column":107}} ), depth0));
},"6":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<h3>Which term makes the most difference?</h3>\n<p>Terms in different units are compared by a typical step of each: from the lower to the upper quartile of its values, or from the baseline to a level.</p>\n"
    + ((stack1 = container.invokePartial(lookupProperty(partials,"figure"),lookupProperty(lookupProperty(depth0,"says"),"ladder"),{"name":"figure","data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "");
},"7":function(container,depth0,helpers,partials,data,blockParams,depths) {
    var stack1, helper, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<article class=\"term"
    + ((stack1 = lookupProperty(helpers,"unless").call(alias1,lookupProperty(depth0,"chart"),{"name":"unless","hash":{},"fn":container.program(8, data, 0, blockParams, depths),"inverse":container.noop,"data":data,"loc":{"start":{"line":24,"column":20},"end":{"line":24,"column":54}}})) != null ? stack1 : "")
    + "\">\n<div>\n<h4>"
    + container.escapeExpression((((helper = lookupProperty(helpers,"heading") || container.strict(depth0, "heading", {"start":{"line":26,"column":6},"end":{"line":26,"column":13}} ))),(typeof helper === "function" ? helper.call(alias1,{"name":"heading","hash":{},"data":data,"loc":{"start":{"line":26,"column":4},"end":{"line":26,"column":15}}}) : helper)))
    + "</h4>\n"
    + ((stack1 = lookupProperty(helpers,"each").call(alias1,lookupProperty(depth0,"sentences"),{"name":"each","hash":{},"fn":container.program(9, data, 0, blockParams, depths),"inverse":container.noop,"data":data,"loc":{"start":{"line":27,"column":0},"end":{"line":29,"column":9}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(depth0,"test"),{"name":"if","hash":{},"fn":container.program(10, data, 0, blockParams, depths),"inverse":container.noop,"data":data,"loc":{"start":{"line":30,"column":0},"end":{"line":32,"column":7}}})) != null ? stack1 : "")
    + "</div>\n"
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(depth0,"chart"),{"name":"if","hash":{},"fn":container.program(11, data, 0, blockParams, depths),"inverse":container.noop,"data":data,"loc":{"start":{"line":34,"column":0},"end":{"line":36,"column":7}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(depth0,"rows"),{"name":"if","hash":{},"fn":container.program(12, data, 0, blockParams, depths),"inverse":container.noop,"data":data,"loc":{"start":{"line":37,"column":0},"end":{"line":49,"column":7}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(depth0,"levels"),{"name":"if","hash":{},"fn":container.program(14, data, 0, blockParams, depths),"inverse":container.noop,"data":data,"loc":{"start":{"line":50,"column":0},"end":{"line":52,"column":7}}})) != null ? stack1 : "")
    + "</article>\n";
},"8":function(container,depth0,helpers,partials,data) {
    return " plain";
},"9":function(container,depth0,helpers,partials,data) {
    return "<p>"
    + container.escapeExpression(container.lambda(depth0, depth0))
    + "</p>\n";
},"10":function(container,depth0,helpers,partials,data) {
    var helper, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<p class=\"small\">"
    + container.escapeExpression((((helper = lookupProperty(helpers,"test") || container.strict(depth0, "test", {"start":{"line":31,"column":19},"end":{"line":31,"column":23}} ))),(typeof helper === "function" ? helper.call(depth0 != null ? depth0 : (container.nullContext || {}),{"name":"test","hash":{},"data":data,"loc":{"start":{"line":31,"column":17},"end":{"line":31,"column":25}}}) : helper)))
    + "</p>\n";
},"11":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = container.invokePartial(lookupProperty(partials,"figure"),lookupProperty(depth0,"chart"),{"name":"figure","data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "");
},"12":function(container,depth0,helpers,partials,data,blockParams,depths) {
    var stack1, helper, alias1=container.strict, alias2=depth0 != null ? depth0 : (container.nullContext || {}), alias3="function", alias4=container.escapeExpression, alias5=container.lambda, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<div class=\"scroll both\" tabindex=\"0\" role=\"region\" aria-label=\""
    + alias4((((helper = lookupProperty(helpers,"heading") || alias1(depth0, "heading", {"start":{"line":38,"column":66},"end":{"line":38,"column":73}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"heading","hash":{},"data":data,"loc":{"start":{"line":38,"column":64},"end":{"line":38,"column":75}}}) : helper)))
    + ", each level\">\n<table>\n<caption>"
    + alias4((((helper = lookupProperty(helpers,"heading") || alias1(depth0, "heading", {"start":{"line":40,"column":11},"end":{"line":40,"column":18}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"heading","hash":{},"data":data,"loc":{"start":{"line":40,"column":9},"end":{"line":40,"column":20}}}) : helper)))
    + ": each with its "
    + alias4(alias5(alias1(lookupProperty(depths[1],"says"), "confidence", {"start":{"line":40,"column":38},"end":{"line":40,"column":56}} ), depth0))
    + " interval</caption>\n<thead><tr><th scope=\"col\">at</th><th scope=\"col\" class=\"n\">difference</th><th scope=\"col\" class=\"n\">"
    + alias4(alias5(alias1(lookupProperty(depths[1],"says"), "confidence", {"start":{"line":41,"column":103},"end":{"line":41,"column":121}} ), depth0))
    + " interval</th></tr></thead>\n<tbody>\n"
    + ((stack1 = lookupProperty(helpers,"each").call(alias2,lookupProperty(depth0,"rows"),{"name":"each","hash":{},"fn":container.program(13, data, 0, blockParams, depths),"inverse":container.noop,"data":data,"loc":{"start":{"line":43,"column":0},"end":{"line":45,"column":9}}})) != null ? stack1 : "")
    + "</tbody>\n</table>\n</div>\n";
},"13":function(container,depth0,helpers,partials,data) {
    var helper, alias1=container.strict, alias2=depth0 != null ? depth0 : (container.nullContext || {}), alias3="function", alias4=container.escapeExpression, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<tr><th scope=\"row\">"
    + alias4((((helper = lookupProperty(helpers,"name") || alias1(depth0, "name", {"start":{"line":44,"column":22},"end":{"line":44,"column":26}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":44,"column":20},"end":{"line":44,"column":28}}}) : helper)))
    + "</th><td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"estimate") || alias1(depth0, "estimate", {"start":{"line":44,"column":49},"end":{"line":44,"column":57}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"estimate","hash":{},"data":data,"loc":{"start":{"line":44,"column":47},"end":{"line":44,"column":59}}}) : helper)))
    + "</td><td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"interval") || alias1(depth0, "interval", {"start":{"line":44,"column":80},"end":{"line":44,"column":88}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"interval","hash":{},"data":data,"loc":{"start":{"line":44,"column":78},"end":{"line":44,"column":90}}}) : helper)))
    + "</td></tr>\n";
},"14":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = container.invokePartial(lookupProperty(partials,"levels"),lookupProperty(depth0,"levels"),{"name":"levels","data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "");
},"15":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<h3>What was asked of the coefficients</h3>\n<dl>\n"
    + ((stack1 = lookupProperty(helpers,"each").call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(lookupProperty(depth0,"says"),"hypotheses"),{"name":"each","hash":{},"fn":container.program(16, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":58,"column":0},"end":{"line":61,"column":9}}})) != null ? stack1 : "")
    + "</dl>\n";
},"16":function(container,depth0,helpers,partials,data) {
    var helper, alias1=container.strict, alias2=depth0 != null ? depth0 : (container.nullContext || {}), alias3="function", alias4=container.escapeExpression, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<dt>"
    + alias4((((helper = lookupProperty(helpers,"name") || alias1(depth0, "name", {"start":{"line":59,"column":6},"end":{"line":59,"column":10}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":59,"column":4},"end":{"line":59,"column":12}}}) : helper)))
    + "?</dt>\n<dd>"
    + alias4((((helper = lookupProperty(helpers,"verdict") || alias1(depth0, "verdict", {"start":{"line":60,"column":6},"end":{"line":60,"column":13}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"verdict","hash":{},"data":data,"loc":{"start":{"line":60,"column":4},"end":{"line":60,"column":15}}}) : helper)))
    + "<span class=\"under full\">"
    + alias4((((helper = lookupProperty(helpers,"evidence") || alias1(depth0, "evidence", {"start":{"line":60,"column":42},"end":{"line":60,"column":50}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"evidence","hash":{},"data":data,"loc":{"start":{"line":60,"column":40},"end":{"line":60,"column":52}}}) : helper)))
    + "</span></dd>\n";
},"17":function(container,depth0,helpers,partials,data) {
    var lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<p class=\"small\">"
    + container.escapeExpression(container.lambda(container.strict(lookupProperty(depth0,"says"), "errors", {"start":{"line":66,"column":19},"end":{"line":66,"column":30}} ), depth0))
    + "</p>\n";
},"18":function(container,depth0,helpers,partials,data) {
    var helper, alias1=container.strict, alias2=depth0 != null ? depth0 : (container.nullContext || {}), alias3="function", alias4=container.escapeExpression, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<tr><th scope=\"row\">"
    + alias4((((helper = lookupProperty(helpers,"name") || alias1(depth0, "name", {"start":{"line":74,"column":22},"end":{"line":74,"column":26}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":74,"column":20},"end":{"line":74,"column":28}}}) : helper)))
    + "</th><td>"
    + alias4((((helper = lookupProperty(helpers,"unit") || alias1(depth0, "unit", {"start":{"line":74,"column":39},"end":{"line":74,"column":43}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"unit","hash":{},"data":data,"loc":{"start":{"line":74,"column":37},"end":{"line":74,"column":45}}}) : helper)))
    + "</td><td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"estimate") || alias1(depth0, "estimate", {"start":{"line":74,"column":66},"end":{"line":74,"column":74}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"estimate","hash":{},"data":data,"loc":{"start":{"line":74,"column":64},"end":{"line":74,"column":76}}}) : helper)))
    + "</td><td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"standardError") || alias1(depth0, "standardError", {"start":{"line":74,"column":97},"end":{"line":74,"column":110}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"standardError","hash":{},"data":data,"loc":{"start":{"line":74,"column":95},"end":{"line":74,"column":112}}}) : helper)))
    + "</td><td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"interval") || alias1(depth0, "interval", {"start":{"line":74,"column":133},"end":{"line":74,"column":141}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"interval","hash":{},"data":data,"loc":{"start":{"line":74,"column":131},"end":{"line":74,"column":143}}}) : helper)))
    + "</td><td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"pValue") || alias1(depth0, "pValue", {"start":{"line":74,"column":164},"end":{"line":74,"column":170}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"pValue","hash":{},"data":data,"loc":{"start":{"line":74,"column":162},"end":{"line":74,"column":172}}}) : helper)))
    + "</td><td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"vif") || alias1(depth0, "vif", {"start":{"line":74,"column":193},"end":{"line":74,"column":196}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"vif","hash":{},"data":data,"loc":{"start":{"line":74,"column":191},"end":{"line":74,"column":198}}}) : helper)))
    + "</td></tr>\n";
},"19":function(container,depth0,helpers,partials,data) {
    var lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<p class=\"small\">"
    + container.escapeExpression(container.lambda(container.strict(lookupProperty(depth0,"says"), "looked", {"start":{"line":80,"column":19},"end":{"line":80,"column":30}} ), depth0))
    + "</p>\n";
},"20":function(container,depth0,helpers,partials,data,blockParams,depths) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<details>\n<summary>More about each coefficient</summary>\n<div class=\"scroll\" tabindex=\"0\" role=\"region\" aria-label=\"More about each coefficient\">\n<table>\n<caption>Standardised: the coefficient in standard deviations of column and response. Partial correlation: with the response, both without what the other columns explain."
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(lookupProperty(lookupProperty(depth0,"says"),"more"),"simultaneous"),{"name":"if","hash":{},"fn":container.program(21, data, 0, blockParams, depths),"inverse":container.noop,"data":data,"loc":{"start":{"line":87,"column":170},"end":{"line":87,"column":234}}})) != null ? stack1 : "")
    + "</caption>\n<thead><tr><th scope=\"col\">coefficient</th><th scope=\"col\" class=\"n\">standardised</th><th scope=\"col\" class=\"n\">partial correlation</th><th scope=\"col\" class=\"n\">R² lost without it</th>"
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(lookupProperty(lookupProperty(depth0,"says"),"more"),"simultaneous"),{"name":"if","hash":{},"fn":container.program(22, data, 0, blockParams, depths),"inverse":container.noop,"data":data,"loc":{"start":{"line":88,"column":185},"end":{"line":88,"column":299}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(lookupProperty(lookupProperty(depth0,"says"),"more"),"hasDrawn"),{"name":"if","hash":{},"fn":container.program(23, data, 0, blockParams, depths),"inverse":container.noop,"data":data,"loc":{"start":{"line":88,"column":299},"end":{"line":88,"column":416}}})) != null ? stack1 : "")
    + "</tr></thead>\n<tbody>\n"
    + ((stack1 = lookupProperty(helpers,"each").call(alias1,lookupProperty(lookupProperty(lookupProperty(depth0,"says"),"more"),"coefficients"),{"name":"each","hash":{},"fn":container.program(24, data, 0, blockParams, depths),"inverse":container.noop,"data":data,"loc":{"start":{"line":90,"column":0},"end":{"line":92,"column":9}}})) != null ? stack1 : "")
    + "</tbody>\n</table>\n</div>\n</details>\n";
},"21":function(container,depth0,helpers,partials,data) {
    var lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return " "
    + container.escapeExpression(container.lambda(container.strict(lookupProperty(lookupProperty(depth0,"says"),"more"), "simultaneous", {"start":{"line":87,"column":203},"end":{"line":87,"column":225}} ), depth0));
},"22":function(container,depth0,helpers,partials,data) {
    var lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<th scope=\"col\" class=\"n\">simultaneous "
    + container.escapeExpression(container.lambda(container.strict(lookupProperty(lookupProperty(depth0,"says"),"more"), "confidence", {"start":{"line":88,"column":256},"end":{"line":88,"column":276}} ), depth0))
    + " interval</th>";
},"23":function(container,depth0,helpers,partials,data) {
    var lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<th scope=\"col\" class=\"n\">"
    + container.escapeExpression(container.lambda(container.strict(lookupProperty(lookupProperty(depth0,"says"),"more"), "confidence", {"start":{"line":88,"column":353},"end":{"line":88,"column":373}} ), depth0))
    + " interval drawn from the rows</th>";
},"24":function(container,depth0,helpers,partials,data,blockParams,depths) {
    var stack1, helper, alias1=container.strict, alias2=depth0 != null ? depth0 : (container.nullContext || {}), alias3="function", alias4=container.escapeExpression, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<tr><th scope=\"row\">"
    + alias4((((helper = lookupProperty(helpers,"name") || alias1(depth0, "name", {"start":{"line":91,"column":22},"end":{"line":91,"column":26}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":91,"column":20},"end":{"line":91,"column":28}}}) : helper)))
    + "</th><td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"standardised") || alias1(depth0, "standardised", {"start":{"line":91,"column":49},"end":{"line":91,"column":61}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"standardised","hash":{},"data":data,"loc":{"start":{"line":91,"column":47},"end":{"line":91,"column":63}}}) : helper)))
    + "</td><td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"partial") || alias1(depth0, "partial", {"start":{"line":91,"column":84},"end":{"line":91,"column":91}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"partial","hash":{},"data":data,"loc":{"start":{"line":91,"column":82},"end":{"line":91,"column":93}}}) : helper)))
    + "</td><td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"lost") || alias1(depth0, "lost", {"start":{"line":91,"column":114},"end":{"line":91,"column":118}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"lost","hash":{},"data":data,"loc":{"start":{"line":91,"column":112},"end":{"line":91,"column":120}}}) : helper)))
    + "</td>"
    + ((stack1 = lookupProperty(helpers,"if").call(alias2,lookupProperty(lookupProperty(lookupProperty(depths[1],"says"),"more"),"simultaneous"),{"name":"if","hash":{},"fn":container.program(25, data, 0, blockParams, depths),"inverse":container.noop,"data":data,"loc":{"start":{"line":91,"column":125},"end":{"line":91,"column":200}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias2,lookupProperty(lookupProperty(lookupProperty(depths[1],"says"),"more"),"hasDrawn"),{"name":"if","hash":{},"fn":container.program(26, data, 0, blockParams, depths),"inverse":container.noop,"data":data,"loc":{"start":{"line":91,"column":200},"end":{"line":91,"column":264}}})) != null ? stack1 : "")
    + "</tr>\n";
},"25":function(container,depth0,helpers,partials,data) {
    var helper, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<td class=\"n\">"
    + container.escapeExpression((((helper = lookupProperty(helpers,"simultaneous") || container.strict(depth0, "simultaneous", {"start":{"line":91,"column":174},"end":{"line":91,"column":186}} ))),(typeof helper === "function" ? helper.call(depth0 != null ? depth0 : (container.nullContext || {}),{"name":"simultaneous","hash":{},"data":data,"loc":{"start":{"line":91,"column":172},"end":{"line":91,"column":188}}}) : helper)))
    + "</td>";
},"26":function(container,depth0,helpers,partials,data) {
    var helper, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<td class=\"n\">"
    + container.escapeExpression((((helper = lookupProperty(helpers,"drawn") || container.strict(depth0, "drawn", {"start":{"line":91,"column":245},"end":{"line":91,"column":250}} ))),(typeof helper === "function" ? helper.call(depth0 != null ? depth0 : (container.nullContext || {}),{"name":"drawn","hash":{},"data":data,"loc":{"start":{"line":91,"column":243},"end":{"line":91,"column":252}}}) : helper)))
    + "</td>";
},"27":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=container.strict, alias2=container.lambda, alias3=container.escapeExpression, alias4=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<details>\n<summary>Averaged over the candidates</summary>\n<p>"
    + alias3(alias2(alias1(lookupProperty(lookupProperty(depth0,"says"),"averaged"), "sentence", {"start":{"line":101,"column":5},"end":{"line":101,"column":27}} ), depth0))
    + "</p>\n<div class=\"scroll long\" tabindex=\"0\" role=\"region\" aria-label=\"Averaged coefficients\">\n<table>\n<caption>Coefficients averaged over the admitted candidates</caption>\n<thead><tr><th scope=\"col\">coefficient</th><th scope=\"col\" class=\"n\">weight of those that have it</th><th scope=\"col\" class=\"n\">estimate</th><th scope=\"col\" class=\"n\">standard error</th><th scope=\"col\" class=\"n\">"
    + alias3(alias2(alias1(lookupProperty(lookupProperty(depth0,"says"),"averaged"), "confidence", {"start":{"line":105,"column":214},"end":{"line":105,"column":238}} ), depth0))
    + " interval</th></tr></thead>\n<tbody>\n"
    + ((stack1 = lookupProperty(helpers,"each").call(alias4,lookupProperty(lookupProperty(lookupProperty(depth0,"says"),"averaged"),"coefficients"),{"name":"each","hash":{},"fn":container.program(28, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":107,"column":0},"end":{"line":109,"column":9}}})) != null ? stack1 : "")
    + "</tbody>\n</table>\n</div>\n"
    + ((stack1 = lookupProperty(helpers,"if").call(alias4,lookupProperty(lookupProperty(lookupProperty(depth0,"says"),"averaged"),"predictions"),{"name":"if","hash":{},"fn":container.program(29, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":113,"column":0},"end":{"line":125,"column":7}}})) != null ? stack1 : "")
    + "</details>\n";
},"28":function(container,depth0,helpers,partials,data) {
    var helper, alias1=container.strict, alias2=depth0 != null ? depth0 : (container.nullContext || {}), alias3="function", alias4=container.escapeExpression, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<tr><th scope=\"row\">"
    + alias4((((helper = lookupProperty(helpers,"name") || alias1(depth0, "name", {"start":{"line":108,"column":22},"end":{"line":108,"column":26}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":108,"column":20},"end":{"line":108,"column":28}}}) : helper)))
    + "</th><td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"weight") || alias1(depth0, "weight", {"start":{"line":108,"column":49},"end":{"line":108,"column":55}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"weight","hash":{},"data":data,"loc":{"start":{"line":108,"column":47},"end":{"line":108,"column":57}}}) : helper)))
    + "</td><td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"estimate") || alias1(depth0, "estimate", {"start":{"line":108,"column":78},"end":{"line":108,"column":86}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"estimate","hash":{},"data":data,"loc":{"start":{"line":108,"column":76},"end":{"line":108,"column":88}}}) : helper)))
    + "</td><td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"standardError") || alias1(depth0, "standardError", {"start":{"line":108,"column":109},"end":{"line":108,"column":122}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"standardError","hash":{},"data":data,"loc":{"start":{"line":108,"column":107},"end":{"line":108,"column":124}}}) : helper)))
    + "</td><td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"interval") || alias1(depth0, "interval", {"start":{"line":108,"column":145},"end":{"line":108,"column":153}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"interval","hash":{},"data":data,"loc":{"start":{"line":108,"column":143},"end":{"line":108,"column":155}}}) : helper)))
    + "</td></tr>\n";
},"29":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<div class=\"scroll long\" tabindex=\"0\" role=\"region\" aria-label=\"Averaged predictions\">\n<table>\n<caption>The same of the mean at the rows asked for, with "
    + container.escapeExpression(container.lambda(container.strict(lookupProperty(lookupProperty(depth0,"says"),"averaged"), "predictionConfidence", {"start":{"line":116,"column":60},"end":{"line":116,"column":94}} ), depth0))
    + " intervals</caption>\n<thead><tr><th scope=\"col\">row</th><th scope=\"col\" class=\"n\">estimate</th><th scope=\"col\" class=\"n\">interval for the mean</th></tr></thead>\n<tbody>\n"
    + ((stack1 = lookupProperty(helpers,"each").call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(lookupProperty(lookupProperty(depth0,"says"),"averaged"),"predictions"),{"name":"each","hash":{},"fn":container.program(30, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":119,"column":0},"end":{"line":121,"column":9}}})) != null ? stack1 : "")
    + "</tbody>\n</table>\n</div>\n";
},"30":function(container,depth0,helpers,partials,data) {
    var helper, alias1=container.strict, alias2=depth0 != null ? depth0 : (container.nullContext || {}), alias3="function", alias4=container.escapeExpression, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<tr><th scope=\"row\">"
    + alias4((((helper = lookupProperty(helpers,"label") || alias1(depth0, "label", {"start":{"line":120,"column":22},"end":{"line":120,"column":27}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"label","hash":{},"data":data,"loc":{"start":{"line":120,"column":20},"end":{"line":120,"column":29}}}) : helper)))
    + "</th><td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"estimate") || alias1(depth0, "estimate", {"start":{"line":120,"column":50},"end":{"line":120,"column":58}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"estimate","hash":{},"data":data,"loc":{"start":{"line":120,"column":48},"end":{"line":120,"column":60}}}) : helper)))
    + "</td><td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"interval") || alias1(depth0, "interval", {"start":{"line":120,"column":81},"end":{"line":120,"column":89}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"interval","hash":{},"data":data,"loc":{"start":{"line":120,"column":79},"end":{"line":120,"column":91}}}) : helper)))
    + "</td></tr>\n";
},"31":function(container,depth0,helpers,partials,data) {
    return "<p>No candidate was admitted, so there is no chosen model to read. The table above gives each candidate’s reason. Three ways on: bring in the variables or rows that the reasons point at; declare a candidate that keeps the rules; or decide, in writing and before looking further, that a rule was the wrong one.</p>\n";
},"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data,blockParams,depths) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<section id=\"says\" aria-labelledby=\"says-heading\">\n<h2 id=\"says-heading\"><span class=\"no\">3</span> What does it say?</h2>\n"
    + ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(depth0,"says"),{"name":"if","hash":{},"fn":container.program(0, data, 0, blockParams, depths),"inverse":container.program(31, data, 0, blockParams, depths),"data":data,"loc":{"start":{"line":3,"column":0},"end":{"line":130,"column":7}}})) != null ? stack1 : "")
    + "</section>\n";
},"usePartial":true,"useData":true,"useDepths":true},
  'style': {"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    return ":root{--paper:#fcfbf8;--ink:#1d1c1a;--soft:#595650;--faint:#d9d5cb;--wash:#f3f0e8;--accent:#84540a;--dot:#6d6a63;--band:#e3cfa6;--edge:#1d1c1a2b}\n@media (prefers-color-scheme:dark){:root{--paper:#171614;--ink:#ece8df;--soft:#b0aa9d;--faint:#403d37;--wash:#211f1c;--accent:#e3b25c;--dot:#a39d90;--band:#57452a;--edge:#00000099}}\n*{box-sizing:border-box}\nhtml{-webkit-text-size-adjust:100%}\nbody{margin:0 auto;max-width:60rem;padding:1.5rem 1.25rem 3rem;background:var(--paper);color:var(--ink);font:1.06rem/1.55 Charter,\"Bitstream Charter\",\"Iowan Old Style\",\"Source Serif 4\",Palatino,\"Palatino Linotype\",Georgia,serif;overflow-wrap:break-word}\ntable,figcaption,svg text,nav,summary,.small,.line,.note,.under,.verdict,.flow b,.brand{font-family:system-ui,-apple-system,\"Segoe UI\",Roboto,\"Helvetica Neue\",sans-serif}\np,ul,ol,dl,h1,h2,h3,h4{max-width:40rem}\nh1,h2,h3,h4{line-height:1.2;font-weight:600;text-wrap:balance}\nh1{font-size:clamp(1.6rem,4.6vw,2.3rem);margin:0}\nh2{font-size:1.5rem;margin:3.2rem 0 .8rem}\nh3{font-size:1.15rem;margin:2rem 0 .4rem}\nh4{font-size:1.05rem;margin:0 0 .4rem}\np{margin:.6rem 0}\na{color:var(--accent)}\n.skip{position:absolute;left:-99rem}\n.skip:focus{position:static}\n.masthead{display:flex;gap:1rem;align-items:flex-start}\n.brand .mark{height:3.6rem;width:1.65rem}\n.mark .string{stroke:var(--accent);stroke-width:1.6;fill:none}\n.mark .weight{fill:var(--accent)}\n.question{font-style:italic;color:var(--soft);font-size:1.15rem;margin:.4rem 0 0}\n.first h2{font-size:1.05rem;margin:0 0 .4rem}\n.quiet{position:absolute;width:1px;height:1px;overflow:hidden;clip-path:inset(50%)}\n.answer{border-left:2px solid var(--accent);padding:.1rem 0 .1rem 1.1rem;margin:1.4rem 0}\n.answer p{font-size:1.18rem;line-height:1.45;margin:0 0 .7rem}\n.answer p.fit{font-size:1.02rem;color:var(--soft);margin-bottom:0}\n.beware{background:var(--wash);padding:1rem 1.2rem;margin:1.4rem 0;max-width:44rem}\n.beware ol{margin:0;padding-left:1.3rem}\n.beware li{margin:.35rem 0}\n.acceptance ul{list-style:none;padding:0;margin:.2rem 0 0;font-size:.92em}\n.acceptance li{margin:.1rem 0}\n.verdict{font-size:.86em;font-weight:700}\n.missed .verdict,.c2 .verdict,.chosen .verdict{color:var(--accent)}\n.line{font-size:.88rem;color:var(--soft);margin:1.2rem 0 1rem}\n@media (min-width:60rem){.screen{display:grid;grid-template-columns:minmax(0,7fr) minmax(0,5fr);gap:0 2.2rem}.screen .line,.screen nav{grid-column:1/-1}.screen .scroll{margin:.6rem 0}.screen .answer p{font-size:1.1rem}.screen .beside{font-size:.96rem;line-height:1.45}.screen .asked td,.screen .asked th{padding-top:.25rem;padding-bottom:.25rem}}\nnav{border-top:1px solid var(--faint);border-bottom:1px solid var(--faint);padding:.5rem 0;font-size:.88rem}\nnav ol{display:flex;flex-wrap:wrap;gap:.1rem 1.3rem;margin:0;padding:0;list-style-position:inside;max-width:none}\nnav li{padding:.15rem 0}\nnav li::marker{color:var(--soft)}\n.no{color:var(--accent);margin-right:.35em}\n.small{font-size:.84rem;line-height:1.5;color:var(--soft)}\n.finding{font-weight:600}\n.flow{list-style:none;padding:0;margin:1rem 0}\n.flow li{display:grid;grid-template-columns:5.5rem 1fr;gap:.8rem;padding:.15rem 0}\n.flow b{text-align:right;font-variant-numeric:tabular-nums;font-weight:600;font-size:.95rem}\n.flow .loss{color:var(--soft)}\n.flow .used{border-top:1px solid var(--ink);margin-top:.2rem;padding-top:.3rem}\n.scroll{overflow-x:auto;margin:1.1rem 0;max-width:100%;background:linear-gradient(to right,var(--paper) 40%,transparent) 0 0/2.5rem 100% no-repeat local,linear-gradient(to left,var(--paper) 40%,transparent) 100% 0/2.5rem 100% no-repeat local,linear-gradient(to right,var(--edge),transparent) 0 0/.9rem 100% no-repeat scroll,linear-gradient(to left,var(--edge),transparent) 100% 0/.9rem 100% no-repeat scroll}\ntable{border-collapse:collapse;font-size:.86rem;line-height:1.4;font-variant-numeric:tabular-nums lining-nums;min-width:min(100%,30rem)}\ncaption{max-width:min(40rem,calc(100vw - 2.5rem));text-align:left;color:var(--soft);padding:0 0 .4rem;caption-side:top}\nth,td{padding:.38rem .9rem .38rem 0;text-align:left;vertical-align:top;border-bottom:1px solid var(--faint)}\nth:last-child,td:last-child{padding-right:0}\nthead th{font-weight:600;color:var(--soft);vertical-align:bottom;border-bottom:1px solid var(--ink)}\ntbody th{font-weight:500;min-width:7.5rem}\ntbody th.n{min-width:0}\n#rows tbody th{min-width:2.5rem}\n.n{text-align:right;white-space:nowrap}\ntd.near{white-space:nowrap}\nthead .n{white-space:normal}\ntr.chosen th,tr.chosen td{font-weight:650}\ntr.chosen .under{font-weight:400}\ntr.total th,tr.total td{border-top:1px solid var(--ink);font-weight:650}\n.under{display:block;color:var(--soft);font-size:.92em;font-weight:400;max-width:24rem}\n@media screen{#tried tbody th{min-width:11rem}}\ndd .full{max-width:40rem;font-size:.82rem;line-height:1.45}\n.term .both{margin-top:.2rem}\ntd.wide{min-width:11rem;max-width:20rem}\n.note{color:var(--accent);font-size:.9em;margin-left:.3em}\ncode{font:.9em ui-monospace,\"SFMono-Regular\",Menlo,Consolas,\"Liberation Mono\",monospace;overflow-wrap:anywhere}\npre{background:var(--wash);padding:.8rem 1rem;overflow-x:auto;max-width:44rem}\npre code{overflow-wrap:normal}\n.hash{font-size:.8em}\n.equation{display:flex;gap:.7rem;background:var(--wash);padding:.9rem 1.1rem;margin:1rem 0 .4rem;font-variant-numeric:tabular-nums lining-nums;max-width:44rem;flex-wrap:wrap}\n.equation ul{list-style:none;margin:0;padding:0}\n.equation .left{white-space:nowrap}\n.equation li{padding-left:1.4em;text-indent:-1.4em}\n.equation .sign{display:inline-block;width:1.1em;text-indent:0}\n.equation .factor{overflow-wrap:anywhere}\nfigure{margin:1.2rem 0;max-width:34rem}\n.canvas svg{display:block;width:100%;height:auto}\nfigcaption{font-size:.88rem;line-height:1.45;margin-top:.3rem;color:var(--ink)}\n.term,.asked-of{border-top:1px solid var(--faint);padding:1.1rem 0 .5rem}\n.asked-of{margin-top:1rem}\n.asked-of h3{margin-top:0}\n.term figure,.charts figure,.pair figure{margin:0;min-width:0}\n@media (min-width:52rem){.term{display:grid;grid-template-columns:minmax(0,5fr) minmax(0,7fr);gap:0 2rem}.term.plain{display:block}.term .both{grid-column:1/-1}.charts{display:grid;grid-template-columns:repeat(2,minmax(0,1fr));gap:1.5rem}.charts figure:only-child{grid-column:1/-1;max-width:29rem}.charts figure:has([aria-labelledby^=residuals-each]){grid-column:1/-1;max-width:36rem}.pair{display:grid;grid-template-columns:minmax(0,7fr) minmax(0,5fr);gap:2rem;align-items:center}}\n.charts{margin-top:1rem}\n@media (max-width:51.99rem){.charts figure+figure{margin-top:1.4rem}}\ndl{margin:.6rem 0}\n.answers{max-width:none;columns:22rem 2;column-gap:2.4rem}\n.answers>div{break-inside:avoid;padding-bottom:.9rem}\n.answers dt{margin:0;font-size:.95rem;line-height:1.35}\n.answers dd{font-size:.95rem;line-height:1.45}\n.answers .under{font-size:.8rem;line-height:1.4;max-width:none;margin-top:.1rem}\ndetails{margin:1.1rem 0;border-top:1px solid var(--faint);padding-top:.5rem}\nsummary{cursor:pointer;color:var(--accent);font-weight:600;max-width:40rem}\nsummary:focus-visible{outline:2px solid var(--accent);outline-offset:3px}\ndt{font-weight:600;margin-top:.7rem}\ndd{margin:0}\nfooter{margin-top:4rem;border-top:1px solid var(--faint);padding-top:1rem;display:flex;gap:.8rem;align-items:center;color:var(--soft);font-size:.88rem}\nfooter p{margin:0}\nfooter .mark{height:2.2rem;width:1rem;flex:none}\nsvg text{fill:var(--ink);font-size:12px;font-variant-numeric:tabular-nums}\nsvg .num{fill:var(--soft);font-size:11.5px}\nsvg .title{fill:var(--soft);font-size:12px}\nsvg .name{paint-order:stroke;stroke:var(--paper);stroke-width:4px;stroke-linejoin:round}\nsvg .strong{font-weight:700}\nsvg .axis,svg .tick{stroke:var(--soft);stroke-width:1}\nsvg .grid{stroke:var(--faint);stroke-width:1}\nsvg .plumb{stroke:var(--accent);stroke-width:1.4}\nsvg .bob{fill:var(--accent)}\nsvg .dots{stroke:var(--dot);stroke-width:3.6;stroke-linecap:round;fill:none;stroke-opacity:.75}\nsvg .fine{stroke-width:2.6}\nsvg .faint{stroke-opacity:.6}\nsvg .thread{stroke:var(--faint);stroke-width:1;fill:none}\nsvg .course{stroke:var(--dot);stroke-width:1.6}\nsvg .trend{stroke:var(--ink);stroke-width:1.6;stroke-dasharray:5 4;fill:none}\nsvg .band{fill:var(--band);fill-opacity:.65}\nsvg .curve{stroke:var(--accent);stroke-width:2.4;fill:none}\nsvg .zone{fill:var(--wash)}\nsvg .reach{stroke:var(--faint);stroke-width:1.5}\nsvg .rung{stroke:var(--ink);stroke-width:1.8}\nsvg .thick{stroke-width:6;stroke:var(--dot)}\nsvg circle{stroke:var(--ink);fill:var(--dot);stroke-width:1}\nsvg circle.chosen{fill:var(--accent);stroke:var(--paper);stroke-width:1.2}\nsvg circle.refused{fill:var(--paper);stroke:var(--ink);stroke-width:1.4}\n@media (max-width:30rem){svg text{font-size:13.5px}svg .num,svg .title{font-size:13px}body{padding:1rem 1rem 2.5rem;font-size:1rem}.answer p{font-size:1.08rem}.beware{padding:.9rem 1rem}.flow li{grid-template-columns:4rem 1fr}}\n@media print{:root{--paper:#fff;--ink:#000;--soft:#444;--faint:#bbb;--wash:#f4f4f4;--accent:#6b4408;--dot:#555;--band:#d8d8d8}@page{size:A4;margin:16mm 15mm 18mm}html{font-size:10pt}body{max-width:none;padding:0;font-size:1.02rem;line-height:1.42}nav,.skip{display:none}details::details-content{content-visibility:visible;display:block;block-size:auto}summary{list-style:none;color:inherit}summary::-webkit-details-marker{display:none}.answers{columns:2}a{color:inherit;text-decoration:none}.scroll,pre{overflow:visible}.scroll{background:none}pre code{white-space:pre-wrap;overflow-wrap:anywhere}table{width:100%;min-width:0}td.wide,tbody th{min-width:0}h2,h3,h4,caption{break-after:avoid}figure,.term,.scroll:not(.long),tr,.beware,.acceptance,.equation,.flow,dt,dd{break-inside:avoid}dt{break-after:avoid}thead{display:table-header-group;break-after:avoid}tbody tr:first-child{break-before:avoid}td.wide{min-width:42mm!important}.answer{margin:4mm 0}.answer p{font-size:1.12rem}.beware{margin:4mm 0}.term{display:grid;grid-template-columns:minmax(0,5fr) minmax(0,7fr);gap:0 6mm}.term.plain{display:block}.term .both{grid-column:1/-1}.charts,.pair{display:grid;grid-template-columns:repeat(2,minmax(0,1fr));gap:6mm;align-items:start}.charts figure:only-child{grid-column:1/-1;max-width:125mm}figure{max-width:125mm;margin:3mm 0}h2{margin-top:9mm}*{-webkit-print-color-adjust:exact;print-color-adjust:exact}}\n";
},"useData":true},
  'tried': {"0":function(container,depth0,helpers,partials,data) {
    return "<p>"
    + container.escapeExpression(container.lambda(depth0, depth0))
    + "</p>\n";
},"1":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<p>To be admitted, a candidate has to keep these rules:</p>\n<ul>\n"
    + ((stack1 = lookupProperty(helpers,"each").call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(lookupProperty(depth0,"tried"),"admission"),{"name":"each","hash":{},"fn":container.program(2, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":9,"column":0},"end":{"line":11,"column":9}}})) != null ? stack1 : "")
    + "</ul>\n";
},"2":function(container,depth0,helpers,partials,data) {
    return "<li>"
    + container.escapeExpression(container.lambda(depth0, depth0))
    + "</li>\n";
},"3":function(container,depth0,helpers,partials,data) {
    var stack1, helper, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<h3>"
    + container.escapeExpression((((helper = lookupProperty(helpers,"name") || container.strict(depth0, "name", {"start":{"line":16,"column":6},"end":{"line":16,"column":10}} ))),(typeof helper === "function" ? helper.call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":16,"column":4},"end":{"line":16,"column":12}}}) : helper)))
    + "</h3>\n"
    + ((stack1 = lookupProperty(helpers,"each").call(alias1,lookupProperty(depth0,"sentences"),{"name":"each","hash":{},"fn":container.program(0, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":17,"column":0},"end":{"line":19,"column":9}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(depth0,"chart"),{"name":"if","hash":{},"fn":container.program(4, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":20,"column":0},"end":{"line":22,"column":7}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(depth0,"path"),{"name":"if","hash":{},"fn":container.program(5, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":23,"column":0},"end":{"line":35,"column":7}}})) != null ? stack1 : "");
},"4":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = container.invokePartial(lookupProperty(partials,"figure"),lookupProperty(depth0,"chart"),{"name":"figure","data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "");
},"5":function(container,depth0,helpers,partials,data) {
    var stack1, helper, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<div class=\"scroll\" tabindex=\"0\" role=\"region\" aria-label=\""
    + container.escapeExpression((((helper = lookupProperty(helpers,"name") || container.strict(depth0, "name", {"start":{"line":24,"column":61},"end":{"line":24,"column":65}} ))),(typeof helper === "function" ? helper.call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":24,"column":59},"end":{"line":24,"column":67}}}) : helper)))
    + ": steps\">\n<table>\n<caption>The steps; F tests each term in the model that has it</caption>\n<thead><tr><th scope=\"col\">term</th><th scope=\"col\" class=\"n\">step</th><th scope=\"col\">action</th><th scope=\"col\">partial F</th></tr></thead>\n<tbody>\n"
    + ((stack1 = lookupProperty(helpers,"each").call(alias1,lookupProperty(depth0,"path"),{"name":"each","hash":{},"fn":container.program(6, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":29,"column":0},"end":{"line":31,"column":9}}})) != null ? stack1 : "")
    + "</tbody>\n</table>\n</div>\n";
},"6":function(container,depth0,helpers,partials,data) {
    var helper, alias1=container.strict, alias2=depth0 != null ? depth0 : (container.nullContext || {}), alias3="function", alias4=container.escapeExpression, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<tr><th scope=\"row\">"
    + alias4((((helper = lookupProperty(helpers,"term") || alias1(depth0, "term", {"start":{"line":30,"column":22},"end":{"line":30,"column":26}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"term","hash":{},"data":data,"loc":{"start":{"line":30,"column":20},"end":{"line":30,"column":28}}}) : helper)))
    + "</th><td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"step") || alias1(depth0, "step", {"start":{"line":30,"column":49},"end":{"line":30,"column":53}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"step","hash":{},"data":data,"loc":{"start":{"line":30,"column":47},"end":{"line":30,"column":55}}}) : helper)))
    + "</td><td>"
    + alias4((((helper = lookupProperty(helpers,"action") || alias1(depth0, "action", {"start":{"line":30,"column":66},"end":{"line":30,"column":72}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"action","hash":{},"data":data,"loc":{"start":{"line":30,"column":64},"end":{"line":30,"column":74}}}) : helper)))
    + "</td><td>"
    + alias4((((helper = lookupProperty(helpers,"evidence") || alias1(depth0, "evidence", {"start":{"line":30,"column":85},"end":{"line":30,"column":93}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"evidence","hash":{},"data":data,"loc":{"start":{"line":30,"column":83},"end":{"line":30,"column":95}}}) : helper)))
    + "</td></tr>\n";
},"7":function(container,depth0,helpers,partials,data) {
    return "<h3>The candidates</h3>\n";
},"8":function(container,depth0,helpers,partials,data) {
    var lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ", best "
    + container.escapeExpression(container.lambda(container.strict(lookupProperty(depth0,"tried"), "criterion", {"start":{"line":42,"column":48},"end":{"line":42,"column":63}} ), depth0))
    + " first";
},"9":function(container,depth0,helpers,partials,data) {
    var lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<th scope=\"col\" class=\"n\">"
    + container.escapeExpression(container.lambda(container.strict(lookupProperty(depth0,"tried"), "criterion", {"start":{"line":43,"column":181},"end":{"line":43,"column":196}} ), depth0))
    + "</th><th scope=\"col\" class=\"n\">from the best</th>";
},"10":function(container,depth0,helpers,partials,data) {
    return "<th scope=\"col\" class=\"n\">weight of evidence</th>";
},"11":function(container,depth0,helpers,partials,data) {
    return "<th scope=\"col\" class=\"n\">error on rows held out</th>";
},"12":function(container,depth0,helpers,partials,data,blockParams,depths) {
    var stack1, helper, alias1=depth0 != null ? depth0 : (container.nullContext || {}), alias2=container.strict, alias3="function", alias4=container.escapeExpression, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<tr"
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(depth0,"chosen"),{"name":"if","hash":{},"fn":container.program(13, data, 0, blockParams, depths),"inverse":container.noop,"data":data,"loc":{"start":{"line":46,"column":3},"end":{"line":46,"column":39}}})) != null ? stack1 : "")
    + "><td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"rank") || alias2(depth0, "rank", {"start":{"line":46,"column":56},"end":{"line":46,"column":60}} ))),(typeof helper === alias3 ? helper.call(alias1,{"name":"rank","hash":{},"data":data,"loc":{"start":{"line":46,"column":54},"end":{"line":46,"column":62}}}) : helper)))
    + "</td><th scope=\"row\">"
    + alias4((((helper = lookupProperty(helpers,"name") || alias2(depth0, "name", {"start":{"line":46,"column":85},"end":{"line":46,"column":89}} ))),(typeof helper === alias3 ? helper.call(alias1,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":46,"column":83},"end":{"line":46,"column":91}}}) : helper)))
    + "<span class=\"under\">"
    + alias4((((helper = lookupProperty(helpers,"terms") || alias2(depth0, "terms", {"start":{"line":46,"column":113},"end":{"line":46,"column":118}} ))),(typeof helper === alias3 ? helper.call(alias1,{"name":"terms","hash":{},"data":data,"loc":{"start":{"line":46,"column":111},"end":{"line":46,"column":120}}}) : helper)))
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(depth0,"scale"),{"name":"if","hash":{},"fn":container.program(14, data, 0, blockParams, depths),"inverse":container.noop,"data":data,"loc":{"start":{"line":46,"column":120},"end":{"line":46,"column":173}}})) != null ? stack1 : "")
    + "</span>"
    + ((stack1 = lookupProperty(helpers,"each").call(alias1,lookupProperty(depth0,"dropped"),{"name":"each","hash":{},"fn":container.program(15, data, 0, blockParams, depths),"inverse":container.noop,"data":data,"loc":{"start":{"line":46,"column":180},"end":{"line":46,"column":256}}})) != null ? stack1 : "")
    + "</th><td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"coefficients") || alias2(depth0, "coefficients", {"start":{"line":46,"column":277},"end":{"line":46,"column":289}} ))),(typeof helper === alias3 ? helper.call(alias1,{"name":"coefficients","hash":{},"data":data,"loc":{"start":{"line":46,"column":275},"end":{"line":46,"column":291}}}) : helper)))
    + "</td>"
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(lookupProperty(depths[1],"tried"),"ranked"),{"name":"if","hash":{},"fn":container.program(16, data, 0, blockParams, depths),"inverse":container.noop,"data":data,"loc":{"start":{"line":46,"column":296},"end":{"line":46,"column":387}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(lookupProperty(depths[1],"tried"),"hasEvidence"),{"name":"if","hash":{},"fn":container.program(17, data, 0, blockParams, depths),"inverse":container.noop,"data":data,"loc":{"start":{"line":46,"column":387},"end":{"line":46,"column":453}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(lookupProperty(depths[1],"tried"),"hasError"),{"name":"if","hash":{},"fn":container.program(18, data, 0, blockParams, depths),"inverse":container.noop,"data":data,"loc":{"start":{"line":46,"column":453},"end":{"line":46,"column":513}}})) != null ? stack1 : "")
    + "<td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"adjustedRSquared") || alias2(depth0, "adjustedRSquared", {"start":{"line":46,"column":529},"end":{"line":46,"column":545}} ))),(typeof helper === alias3 ? helper.call(alias1,{"name":"adjustedRSquared","hash":{},"data":data,"loc":{"start":{"line":46,"column":527},"end":{"line":46,"column":547}}}) : helper)))
    + "</td><td class=\"wide\">"
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(depth0,"chosen"),{"name":"if","hash":{},"fn":container.program(19, data, 0, blockParams, depths),"inverse":container.program(20, data, 0, blockParams, depths),"data":data,"loc":{"start":{"line":46,"column":569},"end":{"line":46,"column":649}}})) != null ? stack1 : "")
    + "</td></tr>\n";
},"13":function(container,depth0,helpers,partials,data) {
    return " class=\"chosen\"";
},"14":function(container,depth0,helpers,partials,data) {
    var helper, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "; response on the "
    + container.escapeExpression((((helper = lookupProperty(helpers,"scale") || container.strict(depth0, "scale", {"start":{"line":46,"column":153},"end":{"line":46,"column":158}} ))),(typeof helper === "function" ? helper.call(depth0 != null ? depth0 : (container.nullContext || {}),{"name":"scale","hash":{},"data":data,"loc":{"start":{"line":46,"column":151},"end":{"line":46,"column":160}}}) : helper)))
    + " scale";
},"15":function(container,depth0,helpers,partials,data) {
    var lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<span class=\"under\">Left out: "
    + container.escapeExpression((lookupProperty(helpers,"rich")||container.strict(depth0, "rich", {"start":{"line":46,"column":229},"end":{"line":46,"column":233}} )).call(depth0 != null ? depth0 : (container.nullContext || {}),depth0,{"name":"rich","hash":{},"data":data,"loc":{"start":{"line":46,"column":227},"end":{"line":46,"column":240}}}))
    + "</span>";
},"16":function(container,depth0,helpers,partials,data) {
    var helper, alias1=container.strict, alias2=depth0 != null ? depth0 : (container.nullContext || {}), alias3="function", alias4=container.escapeExpression, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"value") || alias1(depth0, "value", {"start":{"line":46,"column":335},"end":{"line":46,"column":340}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"value","hash":{},"data":data,"loc":{"start":{"line":46,"column":333},"end":{"line":46,"column":342}}}) : helper)))
    + "</td><td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"difference") || alias1(depth0, "difference", {"start":{"line":46,"column":363},"end":{"line":46,"column":373}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"difference","hash":{},"data":data,"loc":{"start":{"line":46,"column":361},"end":{"line":46,"column":375}}}) : helper)))
    + "</td>";
},"17":function(container,depth0,helpers,partials,data) {
    var helper, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<td class=\"n\">"
    + container.escapeExpression((((helper = lookupProperty(helpers,"evidence") || container.strict(depth0, "evidence", {"start":{"line":46,"column":431},"end":{"line":46,"column":439}} ))),(typeof helper === "function" ? helper.call(depth0 != null ? depth0 : (container.nullContext || {}),{"name":"evidence","hash":{},"data":data,"loc":{"start":{"line":46,"column":429},"end":{"line":46,"column":441}}}) : helper)))
    + "</td>";
},"18":function(container,depth0,helpers,partials,data) {
    var helper, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<td class=\"n\">"
    + container.escapeExpression((((helper = lookupProperty(helpers,"error") || container.strict(depth0, "error", {"start":{"line":46,"column":494},"end":{"line":46,"column":499}} ))),(typeof helper === "function" ? helper.call(depth0 != null ? depth0 : (container.nullContext || {}),{"name":"error","hash":{},"data":data,"loc":{"start":{"line":46,"column":492},"end":{"line":46,"column":501}}}) : helper)))
    + "</td>";
},"19":function(container,depth0,helpers,partials,data) {
    return "<span class=\"verdict\">chosen</span>";
},"20":function(container,depth0,helpers,partials,data) {
    var lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return container.escapeExpression((lookupProperty(helpers,"rich")||container.strict(depth0, "rich", {"start":{"line":46,"column":628},"end":{"line":46,"column":632}} )).call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(depth0,"verdict"),{"name":"rich","hash":{},"data":data,"loc":{"start":{"line":46,"column":626},"end":{"line":46,"column":642}}}));
},"21":function(container,depth0,helpers,partials,data) {
    var lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<p class=\"small\">"
    + container.escapeExpression(container.lambda(container.strict(lookupProperty(depth0,"tried"), "candidatesMore", {"start":{"line":52,"column":19},"end":{"line":52,"column":39}} ), depth0))
    + "</p>\n";
},"22":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = container.invokePartial(lookupProperty(partials,"figure"),lookupProperty(lookupProperty(depth0,"tried"),"chart"),{"name":"figure","data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "");
},"23":function(container,depth0,helpers,partials,data,blockParams,depths) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<div class=\"scroll\" tabindex=\"0\" role=\"region\" aria-label=\"Partial F of nested pairs\">\n<table>\n<caption>Does the larger of two nested candidates improve on the smaller?</caption>\n<thead><tr><th scope=\"col\">smaller</th><th scope=\"col\">larger</th><th scope=\"col\" class=\"n\">partial F</th><th scope=\"col\" class=\"n\">degrees of freedom</th><th scope=\"col\" class=\"n\">p-value</th>"
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(lookupProperty(depth0,"tried"),"pairsDecided"),{"name":"if","hash":{},"fn":container.program(24, data, 0, blockParams, depths),"inverse":container.noop,"data":data,"loc":{"start":{"line":61,"column":193},"end":{"line":61,"column":265}}})) != null ? stack1 : "")
    + "</tr></thead>\n<tbody>\n"
    + ((stack1 = lookupProperty(helpers,"each").call(alias1,lookupProperty(lookupProperty(depth0,"tried"),"pairs"),{"name":"each","hash":{},"fn":container.program(25, data, 0, blockParams, depths),"inverse":container.noop,"data":data,"loc":{"start":{"line":63,"column":0},"end":{"line":65,"column":9}}})) != null ? stack1 : "")
    + "</tbody>\n</table>\n</div>\n";
},"24":function(container,depth0,helpers,partials,data) {
    return "<th scope=\"col\">part in the choice</th>";
},"25":function(container,depth0,helpers,partials,data,blockParams,depths) {
    var stack1, helper, alias1=container.strict, alias2=depth0 != null ? depth0 : (container.nullContext || {}), alias3="function", alias4=container.escapeExpression, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<tr><th scope=\"row\">"
    + alias4((((helper = lookupProperty(helpers,"smaller") || alias1(depth0, "smaller", {"start":{"line":64,"column":22},"end":{"line":64,"column":29}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"smaller","hash":{},"data":data,"loc":{"start":{"line":64,"column":20},"end":{"line":64,"column":31}}}) : helper)))
    + "</th><td>"
    + alias4((((helper = lookupProperty(helpers,"larger") || alias1(depth0, "larger", {"start":{"line":64,"column":42},"end":{"line":64,"column":48}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"larger","hash":{},"data":data,"loc":{"start":{"line":64,"column":40},"end":{"line":64,"column":50}}}) : helper)))
    + "</td><td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"statistic") || alias1(depth0, "statistic", {"start":{"line":64,"column":71},"end":{"line":64,"column":80}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"statistic","hash":{},"data":data,"loc":{"start":{"line":64,"column":69},"end":{"line":64,"column":82}}}) : helper)))
    + "</td><td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"freedom") || alias1(depth0, "freedom", {"start":{"line":64,"column":103},"end":{"line":64,"column":110}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"freedom","hash":{},"data":data,"loc":{"start":{"line":64,"column":101},"end":{"line":64,"column":112}}}) : helper)))
    + "</td><td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"pValue") || alias1(depth0, "pValue", {"start":{"line":64,"column":133},"end":{"line":64,"column":139}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"pValue","hash":{},"data":data,"loc":{"start":{"line":64,"column":131},"end":{"line":64,"column":141}}}) : helper)))
    + "</td>"
    + ((stack1 = lookupProperty(helpers,"if").call(alias2,lookupProperty(lookupProperty(depths[1],"tried"),"pairsDecided"),{"name":"if","hash":{},"fn":container.program(26, data, 0, blockParams, depths),"inverse":container.noop,"data":data,"loc":{"start":{"line":64,"column":146},"end":{"line":64,"column":232}}})) != null ? stack1 : "")
    + "</tr>\n";
},"26":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<td>"
    + ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(depth0,"decided"),{"name":"if","hash":{},"fn":container.program(27, data, 0),"inverse":container.program(28, data, 0),"data":data,"loc":{"start":{"line":64,"column":179},"end":{"line":64,"column":220}}})) != null ? stack1 : "")
    + "</td>";
},"27":function(container,depth0,helpers,partials,data) {
    return "decided";
},"28":function(container,depth0,helpers,partials,data) {
    return "none";
},"29":function(container,depth0,helpers,partials,data) {
    var lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<p class=\"small\">"
    + container.escapeExpression(container.lambda(container.strict(lookupProperty(depth0,"tried"), "pairsNote", {"start":{"line":71,"column":19},"end":{"line":71,"column":34}} ), depth0))
    + "</p>\n";
},"30":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=container.strict, alias2=container.lambda, alias3=container.escapeExpression, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<h3>Would other rows have chosen another?</h3>\n<p>"
    + alias3(alias2(alias1(lookupProperty(lookupProperty(depth0,"tried"),"stability"), "finding", {"start":{"line":75,"column":5},"end":{"line":75,"column":28}} ), depth0))
    + "</p>\n"
    + ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(lookupProperty(lookupProperty(depth0,"tried"),"stability"),"candidates"),{"name":"if","hash":{},"fn":container.program(31, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":76,"column":0},"end":{"line":83,"column":7}}})) != null ? stack1 : "")
    + "<p class=\"small\">"
    + alias3(alias2(alias1(lookupProperty(lookupProperty(depth0,"tried"),"stability"), "method", {"start":{"line":84,"column":19},"end":{"line":84,"column":41}} ), depth0))
    + "</p>\n";
},"31":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<div class=\"charts\">\n"
    + ((stack1 = container.invokePartial(lookupProperty(partials,"figure"),lookupProperty(lookupProperty(lookupProperty(depth0,"tried"),"stability"),"candidates"),{"name":"figure","data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(lookupProperty(lookupProperty(depth0,"tried"),"stability"),"terms"),{"name":"if","hash":{},"fn":container.program(32, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":79,"column":0},"end":{"line":81,"column":7}}})) != null ? stack1 : "")
    + "</div>\n";
},"32":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = container.invokePartial(lookupProperty(partials,"figure"),lookupProperty(lookupProperty(lookupProperty(depth0,"tried"),"stability"),"terms"),{"name":"figure","data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "");
},"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data,blockParams,depths) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<section id=\"tried\" aria-labelledby=\"tried-heading\">\n<h2 id=\"tried-heading\"><span class=\"no\">2</span> What was tried?</h2>\n"
    + ((stack1 = lookupProperty(helpers,"each").call(alias1,lookupProperty(lookupProperty(depth0,"tried"),"rule"),{"name":"each","hash":{},"fn":container.program(0, data, 0, blockParams, depths),"inverse":container.noop,"data":data,"loc":{"start":{"line":3,"column":0},"end":{"line":5,"column":9}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(lookupProperty(depth0,"tried"),"admission"),{"name":"if","hash":{},"fn":container.program(1, data, 0, blockParams, depths),"inverse":container.noop,"data":data,"loc":{"start":{"line":6,"column":0},"end":{"line":13,"column":7}}})) != null ? stack1 : "")
    + "<p class=\"finding\">"
    + container.escapeExpression((lookupProperty(helpers,"rich")||container.strict(depth0, "rich", {"start":{"line":14,"column":21},"end":{"line":14,"column":25}} )).call(alias1,lookupProperty(lookupProperty(depth0,"tried"),"because"),{"name":"rich","hash":{},"data":data,"loc":{"start":{"line":14,"column":19},"end":{"line":14,"column":41}}}))
    + "</p>\n"
    + ((stack1 = lookupProperty(helpers,"each").call(alias1,lookupProperty(lookupProperty(depth0,"tried"),"families"),{"name":"each","hash":{},"fn":container.program(3, data, 0, blockParams, depths),"inverse":container.noop,"data":data,"loc":{"start":{"line":15,"column":0},"end":{"line":36,"column":9}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(lookupProperty(depth0,"tried"),"families"),{"name":"if","hash":{},"fn":container.program(7, data, 0, blockParams, depths),"inverse":container.noop,"data":data,"loc":{"start":{"line":37,"column":0},"end":{"line":39,"column":7}}})) != null ? stack1 : "")
    + "<div class=\"scroll long\" tabindex=\"0\" role=\"region\" aria-label=\"Candidates\">\n<table>\n<caption>Candidates"
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(lookupProperty(depth0,"tried"),"ranked"),{"name":"if","hash":{},"fn":container.program(8, data, 0, blockParams, depths),"inverse":container.noop,"data":data,"loc":{"start":{"line":42,"column":19},"end":{"line":42,"column":78}}})) != null ? stack1 : "")
    + "</caption>\n<thead><tr><th scope=\"col\" class=\"n\">rank</th><th scope=\"col\">candidate and its terms</th><th scope=\"col\" class=\"n\">coefficients</th>"
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(lookupProperty(depth0,"tried"),"ranked"),{"name":"if","hash":{},"fn":container.program(9, data, 0, blockParams, depths),"inverse":container.noop,"data":data,"loc":{"start":{"line":43,"column":133},"end":{"line":43,"column":254}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(lookupProperty(depth0,"tried"),"hasEvidence"),{"name":"if","hash":{},"fn":container.program(10, data, 0, blockParams, depths),"inverse":container.noop,"data":data,"loc":{"start":{"line":43,"column":254},"end":{"line":43,"column":335}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(lookupProperty(depth0,"tried"),"hasError"),{"name":"if","hash":{},"fn":container.program(11, data, 0, blockParams, depths),"inverse":container.noop,"data":data,"loc":{"start":{"line":43,"column":335},"end":{"line":43,"column":417}}})) != null ? stack1 : "")
    + "<th scope=\"col\" class=\"n\">adjusted R²</th><th scope=\"col\">admitted?</th></tr></thead>\n<tbody>\n"
    + ((stack1 = lookupProperty(helpers,"each").call(alias1,lookupProperty(lookupProperty(depth0,"tried"),"candidates"),{"name":"each","hash":{},"fn":container.program(12, data, 0, blockParams, depths),"inverse":container.noop,"data":data,"loc":{"start":{"line":45,"column":0},"end":{"line":47,"column":9}}})) != null ? stack1 : "")
    + "</tbody>\n</table>\n</div>\n"
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(lookupProperty(depth0,"tried"),"candidatesMore"),{"name":"if","hash":{},"fn":container.program(21, data, 0, blockParams, depths),"inverse":container.noop,"data":data,"loc":{"start":{"line":51,"column":0},"end":{"line":53,"column":7}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(lookupProperty(depth0,"tried"),"chart"),{"name":"if","hash":{},"fn":container.program(22, data, 0, blockParams, depths),"inverse":container.noop,"data":data,"loc":{"start":{"line":54,"column":0},"end":{"line":56,"column":7}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(lookupProperty(depth0,"tried"),"pairs"),{"name":"if","hash":{},"fn":container.program(23, data, 0, blockParams, depths),"inverse":container.noop,"data":data,"loc":{"start":{"line":57,"column":0},"end":{"line":69,"column":7}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(lookupProperty(depth0,"tried"),"pairsNote"),{"name":"if","hash":{},"fn":container.program(29, data, 0, blockParams, depths),"inverse":container.noop,"data":data,"loc":{"start":{"line":70,"column":0},"end":{"line":72,"column":7}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(lookupProperty(depth0,"tried"),"stability"),{"name":"if","hash":{},"fn":container.program(30, data, 0, blockParams, depths),"inverse":container.noop,"data":data,"loc":{"start":{"line":73,"column":0},"end":{"line":85,"column":7}}})) != null ? stack1 : "")
    + "</section>\n";
},"usePartial":true,"useData":true,"useDepths":true},
  'trust': {"0":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=container.strict, alias2=container.lambda, alias3=container.escapeExpression, alias4=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<p class=\"finding\">"
    + alias3(alias2(alias1(lookupProperty(depth0,"trust"), "summary", {"start":{"line":4,"column":21},"end":{"line":4,"column":34}} ), depth0))
    + "</p>\n"
    + ((stack1 = lookupProperty(helpers,"if").call(alias4,lookupProperty(lookupProperty(depth0,"trust"),"unseen"),{"name":"if","hash":{},"fn":container.program(1, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":5,"column":0},"end":{"line":18,"column":7}}})) != null ? stack1 : "")
    + "<div class=\"pair\">\n"
    + ((stack1 = container.invokePartial(lookupProperty(partials,"figure"),lookupProperty(lookupProperty(depth0,"trust"),"fitted"),{"name":"figure","data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "")
    + "<div>\n"
    + ((stack1 = lookupProperty(helpers,"each").call(alias4,lookupProperty(lookupProperty(depth0,"trust"),"counts"),{"name":"each","hash":{},"fn":container.program(4, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":22,"column":0},"end":{"line":24,"column":9}}})) != null ? stack1 : "")
    + "<p class=\"small\">"
    + alias3(alias2(alias1(lookupProperty(depth0,"trust"), "arithmetic", {"start":{"line":25,"column":19},"end":{"line":25,"column":35}} ), depth0))
    + "</p>\n</div>\n</div>\n"
    + ((stack1 = lookupProperty(helpers,"if").call(alias4,lookupProperty(lookupProperty(depth0,"trust"),"unseen"),{"name":"if","hash":{},"fn":container.program(5, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":28,"column":0},"end":{"line":30,"column":7}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"each").call(alias4,lookupProperty(lookupProperty(depth0,"trust"),"findings"),{"name":"each","hash":{},"fn":container.program(6, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":31,"column":0},"end":{"line":49,"column":9}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias4,lookupProperty(lookupProperty(depth0,"trust"),"dependencies"),{"name":"if","hash":{},"fn":container.program(11, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":50,"column":0},"end":{"line":73,"column":7}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias4,lookupProperty(lookupProperty(depth0,"trust"),"drawnAgain"),{"name":"if","hash":{},"fn":container.program(16, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":74,"column":0},"end":{"line":84,"column":7}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias4,lookupProperty(lookupProperty(depth0,"trust"),"rows"),{"name":"if","hash":{},"fn":container.program(19, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":85,"column":0},"end":{"line":103,"column":7}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias4,lookupProperty(lookupProperty(depth0,"trust"),"quiet"),{"name":"if","hash":{},"fn":container.program(26, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":104,"column":0},"end":{"line":113,"column":7}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias4,lookupProperty(lookupProperty(depth0,"trust"),"pictures"),{"name":"if","hash":{},"fn":container.program(29, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":114,"column":0},"end":{"line":123,"column":7}}})) != null ? stack1 : "");
},"1":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<article class=\"asked-of\">\n<h3>How does it do on rows it has not seen?</h3>\n<p>"
    + container.escapeExpression(container.lambda(container.strict(lookupProperty(lookupProperty(depth0,"trust"),"unseen"), "finding", {"start":{"line":8,"column":5},"end":{"line":8,"column":25}} ), depth0))
    + "</p>\n"
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(lookupProperty(lookupProperty(depth0,"trust"),"unseen"),"chart"),{"name":"if","hash":{},"fn":container.program(2, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":9,"column":0},"end":{"line":11,"column":7}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"each").call(alias1,lookupProperty(lookupProperty(lookupProperty(depth0,"trust"),"unseen"),"sentences"),{"name":"each","hash":{},"fn":container.program(3, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":12,"column":0},"end":{"line":14,"column":9}}})) != null ? stack1 : "")
    + "</article>\n<article class=\"asked-of\">\n<h3>How close is it to the rows it was fitted on?</h3>\n";
},"2":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = container.invokePartial(lookupProperty(partials,"figure"),lookupProperty(lookupProperty(lookupProperty(depth0,"trust"),"unseen"),"chart"),{"name":"figure","data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "");
},"3":function(container,depth0,helpers,partials,data) {
    return "<p class=\"small\">"
    + container.escapeExpression(container.lambda(depth0, depth0))
    + "</p>\n";
},"4":function(container,depth0,helpers,partials,data) {
    return "<p>"
    + container.escapeExpression(container.lambda(depth0, depth0))
    + "</p>\n";
},"5":function(container,depth0,helpers,partials,data) {
    return "</article>\n";
},"6":function(container,depth0,helpers,partials,data) {
    var stack1, helper, alias1=container.strict, alias2=depth0 != null ? depth0 : (container.nullContext || {}), alias3="function", alias4=container.escapeExpression, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<article class=\"asked-of c"
    + alias4((((helper = lookupProperty(helpers,"concern") || alias1(depth0, "concern", {"start":{"line":32,"column":28},"end":{"line":32,"column":35}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"concern","hash":{},"data":data,"loc":{"start":{"line":32,"column":26},"end":{"line":32,"column":37}}}) : helper)))
    + "\">\n<h3>"
    + alias4((((helper = lookupProperty(helpers,"question") || alias1(depth0, "question", {"start":{"line":33,"column":6},"end":{"line":33,"column":14}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"question","hash":{},"data":data,"loc":{"start":{"line":33,"column":4},"end":{"line":33,"column":16}}}) : helper)))
    + "</h3>\n<p><span class=\"verdict\">"
    + alias4((((helper = lookupProperty(helpers,"word") || alias1(depth0, "word", {"start":{"line":34,"column":27},"end":{"line":34,"column":31}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"word","hash":{},"data":data,"loc":{"start":{"line":34,"column":25},"end":{"line":34,"column":33}}}) : helper)))
    + ".</span> "
    + alias4((lookupProperty(helpers,"rich")||alias1(depth0, "rich", {"start":{"line":34,"column":44},"end":{"line":34,"column":48}} )).call(alias2,lookupProperty(depth0,"verdict"),{"name":"rich","hash":{},"data":data,"loc":{"start":{"line":34,"column":42},"end":{"line":34,"column":58}}}))
    + "</p>\n"
    + ((stack1 = lookupProperty(helpers,"if").call(alias2,lookupProperty(depth0,"advice"),{"name":"if","hash":{},"fn":container.program(7, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":35,"column":0},"end":{"line":37,"column":7}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias2,lookupProperty(depth0,"evidence"),{"name":"if","hash":{},"fn":container.program(8, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":38,"column":0},"end":{"line":40,"column":7}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias2,lookupProperty(depth0,"charts"),{"name":"if","hash":{},"fn":container.program(9, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":41,"column":0},"end":{"line":47,"column":7}}})) != null ? stack1 : "")
    + "</article>\n";
},"7":function(container,depth0,helpers,partials,data) {
    var lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<p><b>What to do:</b> "
    + container.escapeExpression((lookupProperty(helpers,"rich")||container.strict(depth0, "rich", {"start":{"line":36,"column":24},"end":{"line":36,"column":28}} )).call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(depth0,"advice"),{"name":"rich","hash":{},"data":data,"loc":{"start":{"line":36,"column":22},"end":{"line":36,"column":37}}}))
    + "</p>\n";
},"8":function(container,depth0,helpers,partials,data) {
    var helper, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<p class=\"small\">"
    + container.escapeExpression((((helper = lookupProperty(helpers,"evidence") || container.strict(depth0, "evidence", {"start":{"line":39,"column":19},"end":{"line":39,"column":27}} ))),(typeof helper === "function" ? helper.call(depth0 != null ? depth0 : (container.nullContext || {}),{"name":"evidence","hash":{},"data":data,"loc":{"start":{"line":39,"column":17},"end":{"line":39,"column":29}}}) : helper)))
    + "</p>\n";
},"9":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<div class=\"charts\">\n"
    + ((stack1 = lookupProperty(helpers,"each").call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(depth0,"charts"),{"name":"each","hash":{},"fn":container.program(10, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":43,"column":0},"end":{"line":45,"column":9}}})) != null ? stack1 : "")
    + "</div>\n";
},"10":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = container.invokePartial(lookupProperty(partials,"figure"),depth0,{"name":"figure","data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "");
},"11":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<article class=\"asked-of\">\n<h3>Which terms move together?</h3>\n"
    + ((stack1 = lookupProperty(helpers,"each").call(alias1,lookupProperty(lookupProperty(lookupProperty(depth0,"trust"),"dependencies"),"sentences"),{"name":"each","hash":{},"fn":container.program(12, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":53,"column":0},"end":{"line":55,"column":9}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(lookupProperty(lookupProperty(depth0,"trust"),"dependencies"),"chart"),{"name":"if","hash":{},"fn":container.program(13, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":56,"column":0},"end":{"line":58,"column":7}}})) != null ? stack1 : "")
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(lookupProperty(lookupProperty(depth0,"trust"),"dependencies"),"rows"),{"name":"if","hash":{},"fn":container.program(14, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":59,"column":0},"end":{"line":71,"column":7}}})) != null ? stack1 : "")
    + "</article>\n";
},"12":function(container,depth0,helpers,partials,data) {
    var lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<p>"
    + container.escapeExpression((lookupProperty(helpers,"rich")||container.strict(depth0, "rich", {"start":{"line":54,"column":5},"end":{"line":54,"column":9}} )).call(depth0 != null ? depth0 : (container.nullContext || {}),depth0,{"name":"rich","hash":{},"data":data,"loc":{"start":{"line":54,"column":3},"end":{"line":54,"column":16}}}))
    + "</p>\n";
},"13":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = container.invokePartial(lookupProperty(partials,"figure"),lookupProperty(lookupProperty(lookupProperty(depth0,"trust"),"dependencies"),"chart"),{"name":"figure","data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "");
},"14":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<div class=\"scroll long\" tabindex=\"0\" role=\"region\" aria-label=\"Coefficients without their partners\">\n<table>\n<caption>What each coefficient becomes without one of its partners</caption>\n<thead><tr><th scope=\"col\">coefficient</th><th scope=\"col\">without</th><th scope=\"col\" class=\"n\">estimate</th><th scope=\"col\" class=\"n\">standard error</th><th scope=\"col\" class=\"n\">estimate then</th><th scope=\"col\" class=\"n\">standard error then</th></tr></thead>\n<tbody>\n"
    + ((stack1 = lookupProperty(helpers,"each").call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(lookupProperty(lookupProperty(depth0,"trust"),"dependencies"),"rows"),{"name":"each","hash":{},"fn":container.program(15, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":65,"column":0},"end":{"line":67,"column":9}}})) != null ? stack1 : "")
    + "</tbody>\n</table>\n</div>\n";
},"15":function(container,depth0,helpers,partials,data) {
    var helper, alias1=container.strict, alias2=depth0 != null ? depth0 : (container.nullContext || {}), alias3="function", alias4=container.escapeExpression, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<tr><th scope=\"row\">"
    + alias4((((helper = lookupProperty(helpers,"name") || alias1(depth0, "name", {"start":{"line":66,"column":22},"end":{"line":66,"column":26}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":66,"column":20},"end":{"line":66,"column":28}}}) : helper)))
    + "</th><td>"
    + alias4((((helper = lookupProperty(helpers,"leftOut") || alias1(depth0, "leftOut", {"start":{"line":66,"column":39},"end":{"line":66,"column":46}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"leftOut","hash":{},"data":data,"loc":{"start":{"line":66,"column":37},"end":{"line":66,"column":48}}}) : helper)))
    + "</td><td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"estimate") || alias1(depth0, "estimate", {"start":{"line":66,"column":69},"end":{"line":66,"column":77}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"estimate","hash":{},"data":data,"loc":{"start":{"line":66,"column":67},"end":{"line":66,"column":79}}}) : helper)))
    + "</td><td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"standardError") || alias1(depth0, "standardError", {"start":{"line":66,"column":100},"end":{"line":66,"column":113}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"standardError","hash":{},"data":data,"loc":{"start":{"line":66,"column":98},"end":{"line":66,"column":115}}}) : helper)))
    + "</td><td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"estimateWithout") || alias1(depth0, "estimateWithout", {"start":{"line":66,"column":136},"end":{"line":66,"column":151}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"estimateWithout","hash":{},"data":data,"loc":{"start":{"line":66,"column":134},"end":{"line":66,"column":153}}}) : helper)))
    + "</td><td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"standardErrorWithout") || alias1(depth0, "standardErrorWithout", {"start":{"line":66,"column":174},"end":{"line":66,"column":194}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"standardErrorWithout","hash":{},"data":data,"loc":{"start":{"line":66,"column":172},"end":{"line":66,"column":196}}}) : helper)))
    + "</td></tr>\n";
},"16":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<article class=\"asked-of\">\n<h3>Do the intervals hold without their assumptions?</h3>\n"
    + ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(lookupProperty(lookupProperty(depth0,"trust"),"drawnAgain"),"chart"),{"name":"if","hash":{},"fn":container.program(17, data, 0),"inverse":container.program(18, data, 0),"data":data,"loc":{"start":{"line":77,"column":0},"end":{"line":81,"column":7}}})) != null ? stack1 : "")
    + "<p class=\"small\">"
    + container.escapeExpression(container.lambda(container.strict(lookupProperty(lookupProperty(depth0,"trust"),"drawnAgain"), "method", {"start":{"line":82,"column":19},"end":{"line":82,"column":42}} ), depth0))
    + "</p>\n</article>\n";
},"17":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ((stack1 = container.invokePartial(lookupProperty(partials,"figure"),lookupProperty(lookupProperty(lookupProperty(depth0,"trust"),"drawnAgain"),"chart"),{"name":"figure","data":data,"helpers":helpers,"partials":partials,"decorators":container.decorators})) != null ? stack1 : "");
},"18":function(container,depth0,helpers,partials,data) {
    var lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<p>"
    + container.escapeExpression(container.lambda(container.strict(lookupProperty(lookupProperty(depth0,"trust"),"drawnAgain"), "finding", {"start":{"line":80,"column":5},"end":{"line":80,"column":29}} ), depth0))
    + "</p>\n";
},"19":function(container,depth0,helpers,partials,data) {
    var stack1, alias1=depth0 != null ? depth0 : (container.nullContext || {}), lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<article class=\"asked-of\">\n<h3>What would it say without a row?</h3>\n"
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(lookupProperty(depth0,"trust"),"rowsNote"),{"name":"if","hash":{},"fn":container.program(20, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":88,"column":0},"end":{"line":90,"column":7}}})) != null ? stack1 : "")
    + "<div class=\"scroll\" tabindex=\"0\" role=\"region\" aria-label=\"Most influential rows\">\n<table>\n<caption>The rows that move the coefficients most, and the coefficient that each moves most: as it is, and without the row"
    + ((stack1 = lookupProperty(helpers,"if").call(alias1,lookupProperty(lookupProperty(depth0,"trust"),"rowsScale"),{"name":"if","hash":{},"fn":container.program(21, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":93,"column":122},"end":{"line":93,"column":217}}})) != null ? stack1 : "")
    + "</caption>\n<thead><tr><th scope=\"col\">row</th><th scope=\"col\">moves</th><th scope=\"col\" class=\"n\">observed</th><th scope=\"col\" class=\"n\">fitted</th><th scope=\"col\" class=\"n\">standardised residual</th><th scope=\"col\" class=\"n\">leverage</th><th scope=\"col\" class=\"n\">Cook’s distance</th></tr></thead>\n<tbody>\n"
    + ((stack1 = lookupProperty(helpers,"each").call(alias1,lookupProperty(lookupProperty(depth0,"trust"),"rows"),{"name":"each","hash":{},"fn":container.program(22, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":96,"column":0},"end":{"line":98,"column":9}}})) != null ? stack1 : "")
    + "</tbody>\n</table>\n</div>\n</article>\n";
},"20":function(container,depth0,helpers,partials,data) {
    var lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<p>"
    + container.escapeExpression(container.lambda(container.strict(lookupProperty(depth0,"trust"), "rowsNote", {"start":{"line":89,"column":5},"end":{"line":89,"column":19}} ), depth0))
    + "</p>\n";
},"21":function(container,depth0,helpers,partials,data) {
    var lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return ". Observed and fitted values are on the "
    + container.escapeExpression(container.lambda(container.strict(lookupProperty(depth0,"trust"), "rowsScale", {"start":{"line":93,"column":187},"end":{"line":93,"column":202}} ), depth0))
    + " scale";
},"22":function(container,depth0,helpers,partials,data) {
    var stack1, helper, alias1=container.strict, alias2=depth0 != null ? depth0 : (container.nullContext || {}), alias3="function", alias4=container.escapeExpression, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<tr><th scope=\"row\">"
    + alias4((((helper = lookupProperty(helpers,"name") || alias1(depth0, "name", {"start":{"line":97,"column":22},"end":{"line":97,"column":26}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"name","hash":{},"data":data,"loc":{"start":{"line":97,"column":20},"end":{"line":97,"column":28}}}) : helper)))
    + ((stack1 = lookupProperty(helpers,"if").call(alias2,lookupProperty(depth0,"identified"),{"name":"if","hash":{},"fn":container.program(23, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":97,"column":28},"end":{"line":97,"column":91}}})) != null ? stack1 : "")
    + "</th><td class=\"wide\">"
    + ((stack1 = lookupProperty(helpers,"if").call(alias2,lookupProperty(depth0,"moves"),{"name":"if","hash":{},"fn":container.program(24, data, 0),"inverse":container.program(25, data, 0),"data":data,"loc":{"start":{"line":97,"column":113},"end":{"line":97,"column":151}}})) != null ? stack1 : "")
    + "</td><td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"observed") || alias1(depth0, "observed", {"start":{"line":97,"column":172},"end":{"line":97,"column":180}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"observed","hash":{},"data":data,"loc":{"start":{"line":97,"column":170},"end":{"line":97,"column":182}}}) : helper)))
    + "</td><td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"fitted") || alias1(depth0, "fitted", {"start":{"line":97,"column":203},"end":{"line":97,"column":209}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"fitted","hash":{},"data":data,"loc":{"start":{"line":97,"column":201},"end":{"line":97,"column":211}}}) : helper)))
    + "</td><td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"residual") || alias1(depth0, "residual", {"start":{"line":97,"column":232},"end":{"line":97,"column":240}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"residual","hash":{},"data":data,"loc":{"start":{"line":97,"column":230},"end":{"line":97,"column":242}}}) : helper)))
    + "</td><td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"leverage") || alias1(depth0, "leverage", {"start":{"line":97,"column":263},"end":{"line":97,"column":271}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"leverage","hash":{},"data":data,"loc":{"start":{"line":97,"column":261},"end":{"line":97,"column":273}}}) : helper)))
    + "</td><td class=\"n\">"
    + alias4((((helper = lookupProperty(helpers,"distance") || alias1(depth0, "distance", {"start":{"line":97,"column":294},"end":{"line":97,"column":302}} ))),(typeof helper === alias3 ? helper.call(alias2,{"name":"distance","hash":{},"data":data,"loc":{"start":{"line":97,"column":292},"end":{"line":97,"column":304}}}) : helper)))
    + "</td></tr>\n";
},"23":function(container,depth0,helpers,partials,data) {
    var helper, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<span class=\"under\">row "
    + container.escapeExpression((((helper = lookupProperty(helpers,"row") || container.strict(depth0, "row", {"start":{"line":97,"column":72},"end":{"line":97,"column":75}} ))),(typeof helper === "function" ? helper.call(depth0 != null ? depth0 : (container.nullContext || {}),{"name":"row","hash":{},"data":data,"loc":{"start":{"line":97,"column":70},"end":{"line":97,"column":77}}}) : helper)))
    + "</span>";
},"24":function(container,depth0,helpers,partials,data) {
    var helper, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return container.escapeExpression((((helper = lookupProperty(helpers,"moves") || container.strict(depth0, "moves", {"start":{"line":97,"column":128},"end":{"line":97,"column":133}} ))),(typeof helper === "function" ? helper.call(depth0 != null ? depth0 : (container.nullContext || {}),{"name":"moves","hash":{},"data":data,"loc":{"start":{"line":97,"column":126},"end":{"line":97,"column":135}}}) : helper)));
},"25":function(container,depth0,helpers,partials,data) {
    return "–";
},"26":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<article class=\"asked-of\">\n<h3>Asked, with nothing to see</h3>\n<dl class=\"answers\">\n"
    + ((stack1 = lookupProperty(helpers,"each").call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(lookupProperty(depth0,"trust"),"quiet"),{"name":"each","hash":{},"fn":container.program(27, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":108,"column":0},"end":{"line":110,"column":9}}})) != null ? stack1 : "")
    + "</dl>\n</article>\n";
},"27":function(container,depth0,helpers,partials,data) {
    var stack1, helper, alias1=container.strict, alias2=depth0 != null ? depth0 : (container.nullContext || {}), alias3=container.escapeExpression, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<div><dt>"
    + alias3((((helper = lookupProperty(helpers,"question") || alias1(depth0, "question", {"start":{"line":109,"column":11},"end":{"line":109,"column":19}} ))),(typeof helper === "function" ? helper.call(alias2,{"name":"question","hash":{},"data":data,"loc":{"start":{"line":109,"column":9},"end":{"line":109,"column":21}}}) : helper)))
    + "</dt><dd>"
    + alias3((lookupProperty(helpers,"rich")||alias1(depth0, "rich", {"start":{"line":109,"column":32},"end":{"line":109,"column":36}} )).call(alias2,lookupProperty(depth0,"verdict"),{"name":"rich","hash":{},"data":data,"loc":{"start":{"line":109,"column":30},"end":{"line":109,"column":46}}}))
    + ((stack1 = lookupProperty(helpers,"if").call(alias2,lookupProperty(depth0,"evidence"),{"name":"if","hash":{},"fn":container.program(28, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":109,"column":46},"end":{"line":109,"column":108}}})) != null ? stack1 : "")
    + "</dd></div>\n";
},"28":function(container,depth0,helpers,partials,data) {
    var helper, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<span class=\"under\">"
    + container.escapeExpression((((helper = lookupProperty(helpers,"evidence") || container.strict(depth0, "evidence", {"start":{"line":109,"column":84},"end":{"line":109,"column":92}} ))),(typeof helper === "function" ? helper.call(depth0 != null ? depth0 : (container.nullContext || {}),{"name":"evidence","hash":{},"data":data,"loc":{"start":{"line":109,"column":82},"end":{"line":109,"column":94}}}) : helper)))
    + "</span>";
},"29":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<details>\n<summary>The residuals in pictures</summary>\n<div class=\"charts\">\n"
    + ((stack1 = lookupProperty(helpers,"each").call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(lookupProperty(depth0,"trust"),"pictures"),{"name":"each","hash":{},"fn":container.program(10, data, 0),"inverse":container.noop,"data":data,"loc":{"start":{"line":118,"column":0},"end":{"line":120,"column":9}}})) != null ? stack1 : "")
    + "</div>\n</details>\n";
},"30":function(container,depth0,helpers,partials,data) {
    return "<p>There is no chosen model to examine.</p>\n";
},"compiler":[8,">= 4.3.0"],"main":function(container,depth0,helpers,partials,data) {
    var stack1, lookupProperty = container.lookupProperty || function(parent, propertyName) {
        if (Object.prototype.hasOwnProperty.call(parent, propertyName)) {
          return parent[propertyName];
        }
        return undefined
    };

  return "<section id=\"trust\" aria-labelledby=\"trust-heading\">\n<h2 id=\"trust-heading\"><span class=\"no\">4</span> Can it be trusted?</h2>\n"
    + ((stack1 = lookupProperty(helpers,"if").call(depth0 != null ? depth0 : (container.nullContext || {}),lookupProperty(depth0,"trust"),{"name":"if","hash":{},"fn":container.program(0, data, 0),"inverse":container.program(30, data, 0),"data":data,"loc":{"start":{"line":3,"column":0},"end":{"line":126,"column":7}}})) != null ? stack1 : "")
    + "</section>\n";
},"usePartial":true,"useData":true},
};
